import { createBrowserRouter } from 'react-router-dom';
import type { RouteObject } from 'react-router-dom';
import { ErrorPage } from './error-page.tsx';
import { Layout } from './layout.tsx';

type PageModule = Promise<{ Component: () => React.ReactNode }>;

/** One page: its module is fetched when somebody goes there. */
const at = (path: string, load: () => PageModule): RouteObject => ({
  path,
  lazy: load,
  errorElement: <ErrorPage />,
});

export const router = createBrowserRouter([
  {
    element: <Layout />,
    errorElement: <ErrorPage isWhole />,
    hydrateFallbackElement: <div />,
    children: [
      at('/', () => import('#web/pages/home-page.tsx')),
      at('/boilers', () => import('#web/pages/boilers-page.tsx')),
      at('/boilers/:slug', () => import('#web/pages/boiler-page.tsx')),
      at('/sell', () => import('#web/pages/sell-start-page.tsx')),
      at('/sell/:id', () => import('#web/pages/sell-page.tsx')),
      at('/boilers/:slug/survey', () => import('#web/pages/commission-page.tsx')),
      at('/surveys', () => import('#web/pages/surveys-page.tsx')),
      at('/surveys/:id', () => import('#web/pages/order-page.tsx')),
      at('/desk', () => import('#web/pages/desk-page.tsx')),
      at('/desk/surveyor', () => import('#web/pages/surveyor-terms-page.tsx')),
      at('/office', () => import('#web/pages/office-orders-page.tsx')),
      at('/office/money', () => import('#web/pages/office-money-page.tsx')),
      at('/office/members', () => import('#web/pages/office-members-page.tsx')),
      at('/office/record', () => import('#web/pages/office-record-page.tsx')),
      at('/sign-in', () => import('#web/pages/sign-in-page.tsx')),
      at('/sign-up', () => import('#web/pages/sign-up-page.tsx')),
      at('/forgotten', () => import('#web/pages/forgotten-page.tsx')),
      at('/reset', () => import('#web/pages/reset-page.tsx')),
      at('/verify', () => import('#web/pages/verify-page.tsx')),
      at('/account', () => import('#web/pages/account-page.tsx')),
      at('/letters', () => import('#web/pages/letters-page.tsx')),
      at('/problems/:slug', () => import('#web/pages/problem-page.tsx')),
      at('/surveys/:id/examine', () => import('#web/pages/examine-page.tsx')),
      at('/reports/:id', () => import('#web/pages/report-page.tsx')),
      at('/workings', () => import('#web/pages/workings-page.tsx')),
      at('/workings/:id', () => import('#web/pages/working-page.tsx')),
      at('/method', () => import('#web/pages/method-page.tsx')),
      at('/check', () => import('#web/pages/check-page.tsx')),
      at('/check/:code', () => import('#web/pages/check-page.tsx')),
      at('*', () => import('#web/pages/not-found-page.tsx')),
    ],
  },
]);

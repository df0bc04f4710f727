import { Suspense, useEffect, useRef, useState } from 'react';
import { Link, NavLink, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { AccountCorner, AccountPlaces } from '#web/features/accounts/account-corner.tsx';
import { Loading, Mark } from '#web/ui/mark.tsx';
import { Footer } from './footer.tsx';

const places = [
  { to: sitePaths.boilers, label: 'Boilers' },
  { to: sitePaths.sellStart, label: 'Sell' },
  { to: sitePaths.surveys, label: 'Surveys' },
  { to: sitePaths.workings, label: 'Workings' },
  { to: sitePaths.method, label: 'Method' },
];

function Places({ onGo }: { onGo?: () => void }) {
  return places.map(({ to, label }) => (
    <NavLink
      key={to}
      to={to}
      onClick={onGo}
      className={({ isActive }) =>
        `flex min-h-11 items-center border-b-3 font-medium md:min-h-16 ${isActive ? 'border-copper' : 'border-transparent hover:border-rule'}`
      }
    >
      {label}
    </NavLink>
  ));
}

/** Moves focus to the page's own part when the address changes, so that a screen reader follows. */
function useFocusOnMove() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const seen = useRef(pathname);
  useEffect(() => {
    if (seen.current === pathname) return;
    seen.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

/** The frame round every page. */
export function Layout() {
  const [isMenuOpen, setIsMenuOpen] = useState(false);
  const main = useFocusOnMove();
  return (
    <div className="flex min-h-dvh flex-col">
      <a href="#main" className="sr-only z-50 bg-sheet px-4 py-2 focus:not-sr-only focus:absolute">
        To the page
      </a>
      <header className="border-b border-ink">
        <div className="mx-auto flex max-w-[76rem] flex-wrap items-center gap-x-8 px-4 sm:px-6">
          <Link
            to={sitePaths.home}
            className="flex min-h-14 items-center gap-2.5 text-xl font-bold tracking-tight md:min-h-16"
          >
            <Mark />
            Tubeplate
          </Link>
          <nav aria-label="Places" className="hidden gap-7 md:flex">
            <Places />
          </nav>
          <div className="ml-auto flex items-center gap-3">
            <AccountCorner />
            <button
              type="button"
              className="min-h-11 px-2 font-medium md:hidden"
              aria-expanded={isMenuOpen}
              aria-controls="menu"
              onClick={() => {
                setIsMenuOpen(!isMenuOpen);
              }}
            >
              Menu
            </button>
          </div>
          {isMenuOpen && (
            <nav id="menu" aria-label="Places" className="grid w-full border-t border-rule py-2 md:hidden">
              <Places
                onGo={() => {
                  setIsMenuOpen(false);
                }}
              />
              <AccountPlaces
                onGo={() => {
                  setIsMenuOpen(false);
                }}
              />
            </nav>
          )}
        </div>
      </header>
      <main id="main" ref={main} tabIndex={-1} className="flex-1 outline-none">
        <Suspense
          fallback={
            <div className="mx-auto min-h-dvh max-w-[76rem] px-4 sm:px-6">
              <Loading />
            </div>
          }
        >
          <Outlet />
        </Suspense>
      </main>
      <Footer />
      <ScrollRestoration />
    </div>
  );
}

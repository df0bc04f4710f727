import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from './app/query-client.ts';
import { router } from './app/router.tsx';
import { UnitsProvider } from './lib/units.tsx';
import './styles.css';

const root = document.querySelector('#root');
if (!root) throw new Error('The page has no root');
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={createQueryClient()}>
      <UnitsProvider>
        <RouterProvider router={router} />
      </UnitsProvider>
    </QueryClientProvider>
  </StrictMode>,
);

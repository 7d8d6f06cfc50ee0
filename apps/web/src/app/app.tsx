import type { QueryClient } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { RouterProvider, type DataRouter } from 'react-router-dom';
import { Providers } from './providers';

export function App({ router, queries }: { router: DataRouter; queries: QueryClient }) {
  return (
    <StrictMode>
      <Providers queries={queries}>
        <RouterProvider router={router} />
      </Providers>
    </StrictMode>
  );
}

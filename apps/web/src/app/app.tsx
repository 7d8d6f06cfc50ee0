import type { QueryClient } from '@tanstack/react-query';
import { RouterProvider, type DataRouter } from 'react-router-dom';
import { Providers } from './providers';

export function App({ router, queries }: { router: DataRouter; queries: QueryClient }) {
  return (
    <Providers queries={queries}>
      <RouterProvider router={router} />
    </Providers>
  );
}

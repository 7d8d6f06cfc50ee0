import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createMemoryRouter, RouterProvider, type RouteObject } from 'react-router-dom';
import { Providers } from '../app/providers';
import { makeQueryClient } from '../lib/query-client';

/** Renders something with all that our components expect around them, at an address. */
export function renderWithProviders(ui: ReactNode, at = '/') {
  return renderRoutes([{ path: '*', element: ui }], at);
}

/** Renders routes of the real router in memory. */
export function renderRoutes(routes: RouteObject[], at = '/') {
  const router = createMemoryRouter(routes, { initialEntries: [at] });
  const queries = makeQueryClient();
  const view = render(
    <Providers queries={queries}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { ...view, router, queries };
}

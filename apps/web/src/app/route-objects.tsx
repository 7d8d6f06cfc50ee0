import type { RouteObject } from 'react-router-dom';
import { ErrorPage } from './error-page';
import { Shell } from './layout/shell';
import { NotFoundPage } from './not-found-page';
import { pageRoutes } from './routes';

/** The registry as React Router wants it: every page lazy, inside the shell, faults caught below the header. */
export function routeObjects(): RouteObject[] {
  return [
    {
      element: <Shell />,
      errorElement: <ErrorPage />,
      // The first page is fetched before the first render (see main.tsx), so that there is nothing to show meanwhile.
      hydrateFallbackElement: <></>,
      children: [
        {
          errorElement: <ErrorPage />,
          children: [
            ...pageRoutes.map(({ path, title, page }) => ({
              path,
              handle: { title },
              lazy: async () => ({ Component: await page() }),
            })),
            { path: '*', handle: { title: 'Page not found' }, element: <NotFoundPage /> },
          ],
        },
      ],
    },
  ];
}

import { createRoot, hydrateRoot } from 'react-dom/client';
import { createBrowserRouter, matchRoutes, type RouteObject } from 'react-router-dom';
import { App } from './app/app';
import { routeObjects } from './app/route-objects';
import { makeQueryClient } from './lib/query-client';
import './theme/first-paint.css';

/** Fetches the page that the address asks for before the first render: a prerendered one must not flash empty. */
async function withFirstPage(routes: RouteObject[]): Promise<RouteObject[]> {
  for (const { route } of matchRoutes(routes, window.location) ?? []) {
    if (typeof route.lazy !== 'function') continue;
    Object.assign(route, await route.lazy(), { lazy: undefined });
  }
  return routes;
}

async function start(root: HTMLElement): Promise<void> {
  const routes = routeObjects();
  // A page that cannot be fetched here is fetched again by the router, which shows what went wrong.
  await withFirstPage(routes).catch(() => undefined);
  const app = <App router={createBrowserRouter(routes)} queries={makeQueryClient()} />;
  const { dataset } = document.documentElement;
  if (root.hasChildNodes() && dataset.foreign === undefined) {
    hydrateRoot(root, app);
    return;
  }
  root.replaceChildren();
  delete dataset.foreign;
  createRoot(root).render(app);
}

const root = document.getElementById('root');
if (root) void start(root);

import { renderToString } from 'react-dom/server';
import { createStaticHandler, createStaticRouter, StaticRouterProvider } from 'react-router-dom';
import { pageTitle } from '../lib/page-title';
import { makeQueryClient } from '../lib/query-client';
import { Providers } from './providers';
import { routeObjects } from './route-objects';
import { pageRoutes } from './routes';
import { collectStyles } from './style-collector';

export interface PrerenderedPage {
  path: string;
  title: string;
  html: string;
  /** A style element for the head. */
  style: string;
}

async function prerenderPage(path: string, title: string): Promise<PrerenderedPage> {
  const handler = createStaticHandler(routeObjects());
  const context = await handler.query(new Request(`http://localhost${path}`));
  if (context instanceof Response) throw new Error(`${path} answered ${context.status} instead of a page`);
  const markup = renderToString(
    <Providers queries={makeQueryClient()}>
      <StaticRouterProvider
        router={createStaticRouter(handler.dataRoutes, context)}
        context={context}
        hydrate={false}
      />
    </Providers>,
  );
  return { path, title: pageTitle(title), ...collectStyles(markup) };
}

/** Renders every page of the registry that shows the same to everybody. */
export async function prerender(): Promise<PrerenderedPage[]> {
  const pages: PrerenderedPage[] = [];
  for (const { path, title, prerendered } of pageRoutes) {
    if (prerendered) pages.push(await prerenderPage(path, title));
  }
  return pages;
}

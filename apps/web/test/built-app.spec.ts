// @vitest-environment node
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { budgetsKb, routeList } from '../src/app/route-list';
import { buildApp, firstLoad, gzippedKb, pageModules, type BuiltApp } from './built-app';

let app: BuiltApp;
beforeAll(async () => {
  app = await buildApp();
}, 120_000);
afterAll(() => app.remove());

describe('first-load JavaScript', () => {
  it('knows the module of every page of the registry', () => {
    expect([...pageModules().keys()].sort()).toEqual(routeList.map(({ path }) => path).sort());
  });

  it.each(routeList.map(({ path, budget }) => [path, budgetsKb[budget]] as const))(
    'of %s is at most %d KB',
    (path, budget) => {
      const files = firstLoad(app, pageModules().get(path) ?? '');
      expect(files.length).toBeGreaterThanOrEqual(1);
      const size = gzippedKb(app, files);
      expect(size).toBeGreaterThan(60);
      expect(size).toBeLessThanOrEqual(budget);
    },
  );
});

describe('the written pages', () => {
  const written = routeList.filter(({ prerendered }) => prerendered);

  it.each(written)(
    '$path has its title, its heading and its styles without any script',
    ({ path, title }) => {
      const html = app.read(`${path === '/' ? '' : path.slice(1)}/index.html`.replace(/^\//, ''));
      expect(html).toContain(`<title>${title} – Linkfell</title>`);
      expect(html).toContain(`data-page="${path}"`);
      expect(html.match(/<h1/g)).toHaveLength(1);
      expect(html).toMatch(/<style data-emotion="css [^"]+">[^<]+<\/style>/);
      expect(html).not.toMatch(/<script(?![^>]*\bsrc=)/);
      expect(html).not.toMatch(/https?:\/\/(?!www\.w3\.org)/);
    },
  );

  it('leave an empty page for all other addresses', () => {
    expect(app.read('app.html')).toContain('<div id="root"></div>');
  });

  it('ask for the one font file at once', () => {
    expect(app.read('index.html')).toMatch(
      /<link rel="preload" as="font"[^>]+nunito-latin-wght[^>]+\.woff2"/,
    );
  });
});

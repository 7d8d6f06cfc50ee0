import { mkdir, readFile, rm, writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { build, type Plugin } from 'vite';
import type { PrerenderedPage } from '../src/app/prerender';

const web = resolve(import.meta.dirname, '..');
const conditions = ['@linkfell/source', 'module', 'node', 'production'];

/** Compiles the app for Node once more, where it is only called and never served, and calls it. */
async function renderPages(): Promise<PrerenderedPage[]> {
  const outDir = join(web, 'node_modules/.cache', `prerender-${process.pid}`);
  await build({
    root: web,
    configFile: false,
    logLevel: 'warn',
    resolve: { conditions },
    ssr: { noExternal: [/^@linkfell\//], resolve: { conditions } },
    build: { ssr: join(web, 'src/app/prerender.tsx'), outDir, emptyOutDir: true, copyPublicDir: false },
  });
  try {
    const module = (await import(pathToFileURL(join(outDir, 'prerender.js')).href)) as {
      prerender: () => Promise<PrerenderedPage[]>;
    };
    return await module.prerender();
  } finally {
    await rm(outDir, { recursive: true, force: true });
  }
}

/** Exactly one place each, or the page would be half made without a word. */
function replaceOnce(text: string, part: string, by: string): string {
  if (text.split(part).length !== 2) throw new Error(`The built page has no single ${part}`);
  return text.replace(part, () => by);
}

function fill(template: string, page: PrerenderedPage): string {
  const titled = replaceOnce(template, '<title>Linkfell</title>', `<title>${page.title}</title>`);
  const styled = replaceOnce(titled, '</head>', `${page.style}</head>`);
  const named = replaceOnce(styled, '<html lang="en-GB">', `<html lang="en-GB" data-page="${page.path}">`);
  return replaceOnce(named, '<div id="root"></div>', `<div id="root">${page.html}</div>`);
}

/**
 * After a build: writes the pages marked `prerendered` as HTML files, each with the styles that it needs, and the
 * empty page for all other addresses as app.html beside them.
 */
export function prerenderPages(): Plugin {
  let dist = '';
  return {
    name: 'linkfell:prerender-pages',
    apply: 'build',
    configResolved(config) {
      dist = resolve(config.root, config.build.outDir);
    },
    async closeBundle() {
      const template = await readFile(join(dist, 'index.html'), 'utf8');
      await writeFile(join(dist, 'app.html'), template);
      for (const page of await renderPages()) {
        const folder = join(dist, page.path);
        await mkdir(folder, { recursive: true });
        await writeFile(join(folder, 'index.html'), fill(template, page));
      }
    },
  };
}

import { mkdir, readFile, rm, writeFile } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { build, type Plugin } from 'vite';
import type { PrerenderedPage } from '../src/app/prerender';

const here = import.meta.dirname;
const outDir = resolve(here, '../node_modules/.cache/prerender');

/** Compiles the app for Node once more, where it is only called and never served. */
async function compile(): Promise<() => Promise<PrerenderedPage[]>> {
  await build({
    root: resolve(here, '..'),
    configFile: false,
    logLevel: 'warn',
    resolve: { conditions: ['@linkfell/source', 'module', 'node', 'production'] },
    ssr: { noExternal: [/^@linkfell\//], resolve: { conditions: ['@linkfell/source', 'module', 'node', 'production'] } },
    build: { ssr: resolve(here, '../src/app/prerender.tsx'), outDir, emptyOutDir: true, copyPublicDir: false },
  });
  const module = (await import(`${pathToFileURL(join(outDir, 'prerender.js')).href}?${Date.now()}`)) as {
    prerender: () => Promise<PrerenderedPage[]>;
  };
  return module.prerender;
}

const fill = (template: string, page: PrerenderedPage, chunks: readonly string[]): string =>
  template
    .replace(/<title>.*?<\/title>/, () => `<title>${page.title}</title>`)
    .replace('</head>', () => {
      const preloads = chunks.map((file) => `<link rel="modulepreload" crossorigin href="/${file}">`);
      return `${preloads.join('')}${page.style}</head>`;
    })
    .replace('<div id="root"></div>', () => `<div id="root">${page.html}</div>`);

/** After a build: writes the pages marked `prerendered` as HTML files, each with the styles that it needs. */
export function prerenderPages(): Plugin {
  let dist = '';
  let chunksByPage: Record<string, string[]> = {};
  return {
    name: 'linkfell:prerender-pages',
    apply: 'build',
    configResolved: (config) => {
      dist = resolve(config.root, config.build.outDir);
    },
    generateBundle: (_options, bundle) => {
      chunksByPage = {};
      for (const chunk of Object.values(bundle)) {
        if (chunk.type !== 'chunk' || !chunk.facadeModuleId || chunk.isEntry) continue;
        chunksByPage[chunk.facadeModuleId.replace(/^.*\/src\//, '')] = [chunk.fileName, ...chunk.imports];
      }
    },
    closeBundle: {
      sequential: true,
      async handler() {
        const template = await readFile(join(dist, 'index.html'), 'utf8');
        const prerender = await compile();
        for (const page of await prerender()) {
          const already = (file: string) => template.includes(file);
          const chunks = (chunksByPage[page.module] ?? []).filter((file) => !already(file));
          const target = join(dist, page.path, 'index.html');
          await mkdir(dirname(target), { recursive: true });
          await writeFile(page.path === '/' ? join(dist, 'front.html') : target, fill(template, page, chunks));
        }
        await rm(outDir, { recursive: true, force: true });
      },
    },
  };
}

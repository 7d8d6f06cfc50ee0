import type { Plugin } from 'vite';

/** Asks for the one font file at once: otherwise the browser finds it only after the style sheet. */
export function preloadFont(): Plugin {
  return {
    name: 'linkfell:preload-font',
    apply: 'build',
    transformIndexHtml: {
      order: 'post',
      handler(_html, { bundle }) {
        return Object.keys(bundle ?? {})
          .filter((file) => file.endsWith('.woff2'))
          .map((file) => ({
            tag: 'link',
            injectTo: 'head-prepend',
            attrs: { rel: 'preload', as: 'font', type: 'font/woff2', href: `/${file}`, crossorigin: '' },
          }));
      },
    },
  };
}

import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { preloadFont } from './scripts/preload-font.ts';
import { prerenderPages } from './scripts/prerender-pages.ts';

const api = { target: process.env.API_URL ?? 'http://127.0.0.1:4310', changeOrigin: false };

export default defineConfig(({ mode }) => ({
  plugins: [react(), preloadFont(), prerenderPages()],
  resolve: {
    conditions: [
      '@linkfell/source',
      'module',
      'browser',
      mode === 'production' ? 'production' : 'development',
    ],
  },
  server: { proxy: { '/api': api, '/health': api } },
  build: {
    manifest: true,
    target: 'es2022',
    // A data: address for a font or a script would need a looser policy.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
  },
}));

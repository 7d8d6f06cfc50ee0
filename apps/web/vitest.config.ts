import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const conditions = ['@linkfell/source', 'module', 'browser', 'development'];

export default defineConfig({
  plugins: [react()],
  resolve: { conditions },
  ssr: { resolve: { conditions: ['@linkfell/source', 'module', 'default'] } },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.{ts,tsx}', 'test/**/*.spec.{ts,tsx}'],
    setupFiles: ['src/testing/setup.ts'],
    css: false,
  },
});

import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['@linkfell/source', 'module', 'default'] },
  ssr: { resolve: { conditions: ['@linkfell/source', 'module', 'default'] } },
  test: { include: ['src/**/*.spec.ts', 'test/**/*.spec.ts'] },
});

import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['@linkfell/source', 'module', 'default'] },
  ssr: { resolve: { conditions: ['@linkfell/source', 'module', 'default'] } },
  // Thousands of drawn questions on a busy machine take longer than the usual five seconds.
  test: { testTimeout: 60_000, include: ['src/**/*.spec.ts', 'test/**/*.spec.ts'] },
});

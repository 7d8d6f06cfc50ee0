import { readConfig, type Config } from '../../src/config/config.js';

/** A complete configuration for one test file; overrides are the values of environment variables. */
export function testConfig(overrides: Record<string, string>): Config {
  return readConfig({
    NODE_ENV: 'test',
    PORT: '0',
    PUBLIC_URL: 'http://127.0.0.1:4310',
    SESSION_SECRET: 'only for tests, only for tests, only for tests',
    STRIPE_SECRET_KEY: 'sk_test_linkfell',
    STRIPE_WEBHOOK_SECRET: 'whsec_linkfell_test',
    SMTP_URL: 'smtp://127.0.0.1:9',
    LOG_LEVEL: 'silent',
    WORKER: 'off',
    RATE_LIMIT_SCALE: '100000',
    ...overrides,
  });
}

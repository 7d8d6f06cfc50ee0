import { defineConfig, devices } from '@playwright/test';

/** Debian's own Chromium: nothing is downloaded. Root may not use its sandbox. */
const launchOptions = {
  executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
  args: [
    ...(process.getuid?.() === 0 ? ['--no-sandbox'] : []),
    ...['--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking'],
    ...['--disable-component-update', '--disable-sync'],
  ],
};

export default defineConfig({
  testDir: 'e2e',
  outputDir: 'test-results',
  forbidOnly: true,
  // Two cores, shared with the API, PostgreSQL and the stand-ins.
  workers: 1,
  timeout: 180_000,
  expect: { timeout: 30_000 },
  use: { ...devices['Desktop Chrome'], launchOptions, locale: 'en-GB', trace: 'retain-on-failure' },
});

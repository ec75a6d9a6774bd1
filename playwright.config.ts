import { defineConfig } from '@playwright/test';

const switches = ['gpu', 'quic', 'background-networking', 'component-update', 'sync'].map(
  (each) => `--disable-${each}`,
);

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: '.data/test/browser',
  // Two at a time: one would leave a core idle, three would wait for the app, which shares the machine with the browsers.
  workers: 2,
  fullyParallel: true,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  forbidOnly: Boolean(process.env['CI']),
  use: {
    // `npm test` serves the build at an address of its own; alone, the tests use the development server.
    baseURL: process.env['CELLARSUN_TEST_URL'] ?? 'http://localhost:3100',
    launchOptions: {
      executablePath: '/usr/bin/chromium',
      args: ['--no-sandbox', '--no-first-run', ...switches],
    },
    trace: 'off',
    screenshot: 'only-on-failure',
  },
});

/** The browser tests run against the built page, served by the project's own server on a port that is free. */

import { defineConfig } from 'playwright/test';
import { launchOptions } from './launch.ts';

export default defineConfig({
  testDir: '.',
  outputDir: '../../test-results',
  globalSetup: './serve-page.ts',
  forbidOnly: true,
  fullyParallel: true,
  workers: 2,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: 'list',
  use: {
    ...(process.env['POLEWARD_PAGE'] ? { baseURL: process.env['POLEWARD_PAGE'] } : {}),
    locale: 'en-GB',
    timezoneId: 'UTC',
    viewport: { width: 1440, height: 900 },
    screenshot: 'only-on-failure',
    launchOptions: launchOptions(),
  },
});

import { defineConfig } from '@playwright/test';
import { LAUNCH_OPTIONS } from './support/chromium';

export default defineConfig({
  testDir: 'specs',
  outputDir: 'test-results',
  globalSetup: './support/global-setup.ts',
  timeout: 60_000,
  // Long enough for a busy machine, short enough to tell which step of a story hangs.
  expect: { timeout: 10_000 },
  // The browser, the server and its search share two cores: a second worker only makes both slower.
  workers: 1,
  retries: 1,
  forbidOnly: true,
  reporter: 'list',
  use: {
    browserName: 'chromium',
    headless: true,
    launchOptions: LAUNCH_OPTIONS,
    viewport: { width: 1440, height: 900 },
    actionTimeout: 15_000,
    trace: 'on-first-retry',
  },
});

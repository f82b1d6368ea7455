import { defineConfig } from '@playwright/test';
import tests from './playwright.config';

/** `npm run screenshots`: takes the pictures of the README again. */
export default defineConfig({
  ...tests,
  testDir: 'pictures',
  outputDir: 'test-results/pictures',
  retries: 0,
});

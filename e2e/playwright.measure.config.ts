import { defineConfig } from '@playwright/test';
import tests from './playwright.config';

/** `npm run measure -w e2e`: times that mean something only on a machine with nothing else to do, so no test waits on them. */
export default defineConfig({ ...tests, testDir: 'measure', outputDir: 'test-results/measure', retries: 0 });

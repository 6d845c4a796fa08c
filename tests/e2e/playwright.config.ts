import { defineConfig } from '@playwright/test';
import { chromiumFlags, chromiumPath } from '../../server/cli/lib/chromium-launch.cjs';

const reportFile = process.env.PLAYWRIGHT_JSON_OUTPUT_FILE;

export default defineConfig({
  testDir: '.',
  outputDir: '../../test-results',
  globalSetup: './support/global-setup.mjs',
  reporter: reportFile ? [['list'], ['json', { outputFile: reportFile }]] : [['list']],
  // A test that needs a second try hides a fault.
  retries: 0,
  workers: 2,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  use: {
    // Set by the global set-up, which has run by the time a worker reads this.
    baseURL: process.env.E2E_SITE_URL,
    actionTimeout: 15_000,
    locale: 'en-US',
    timezoneId: 'America/Chicago',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: { executablePath: chromiumPath, args: [...chromiumFlags] },
  },
  projects: [
    { name: 'phone', testMatch: '*-phone.spec.ts', use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } },
    { name: 'wide', testIgnore: '*-phone.spec.ts', use: { viewport: { width: 1440, height: 900 } } },
  ],
});

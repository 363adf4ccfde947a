import { defineConfig } from '@playwright/test';

/** Keeps the browser off the network and out of the way of a machine without a screen. */
const args = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/**
 * `npm test` starts the product and says where it is. A test runs at a desk, unless its title says otherwise:
 * @touch on a tablet, @phone on a phone, @widths at all three.
 */
export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results',
  globalSetup: './tests/e2e/setup/sign-in-once.ts',
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: 'list',
  use: {
    baseURL: process.env.TAMIS_BASE_URL,
    browserName: 'chromium',
    launchOptions: { executablePath: '/usr/bin/chromium', args },
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    colorScheme: 'light',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
  },
  projects: [
    { name: 'desk', grepInvert: /@touch|@phone/, use: { viewport: { width: 1440, height: 940 } } },
    { name: 'tablet', grep: /@touch|@widths/, use: { viewport: { width: 1024, height: 1366 }, hasTouch: true, isMobile: true } },
    { name: 'phone', grep: /@phone|@widths/, use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 } },
  ],
});

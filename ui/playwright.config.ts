import { defineConfig } from '@playwright/test';

/**
 * The whole product in a real browser. `npm run test:browser` starts it on a database of its own and says where it is:
 * BASE_URL, MAIL_FOLDER, DEMO_PASSWORD and CHROMIUM_PATH.
 */
export default defineConfig({
  testDir: './e2e',
  testMatch: '**/*.e2e.ts',
  workers: 1,
  retries: 0,
  forbidOnly: true,
  // A story of five people is one test; two cores also run the server and the database.
  timeout: 240_000,
  expect: { timeout: 15_000 },
  reporter: [['list']],
  use: {
    baseURL: process.env.BASE_URL,
    browserName: 'chromium',
    actionTimeout: 20_000,
    navigationTimeout: 30_000,
    locale: 'en-US',
    timezoneId: 'Europe/Berlin',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
});

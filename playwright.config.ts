import { defineConfig } from '@playwright/test'

const asRoot = process.getuid?.() === 0

/** The journeys run against a server that `npm test` has started; its address and services are in the environment. */
export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results',
  // One at a time: the journeys share one observatory, and two cores serve browser, application and database.
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  // A busy machine may miss a time-out once; a second try that passes is reported as such.
  retries: 1,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: process.env.NEXTAUTH_URL,
    locale: 'en-GB',
    // Neither UTC nor a neighbour of it: a page that mixes local time and UTC is found out.
    timezoneId: 'America/Santiago',
    viewport: { width: 1280, height: 900 },
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH || '/usr/bin/chromium',
      args: [
        ...(asRoot ? ['--no-sandbox'] : []),
        '--disable-gpu',
        '--disable-dev-shm-usage',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
})

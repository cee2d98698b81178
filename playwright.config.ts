import { defineConfig } from '@playwright/test'

/**
 * Drives the built product that `npm test` has brought up, with the demo in it and its films ready. It tells the tests
 * E2E_BASE_URL, E2E_MAILBOX_URL (GET /messages), E2E_SEARCH_URL, DATABASE_URL and E2E_PIDS_FILE ({ web, worker, … }, for
 * a kill -9 that is meant).
 */
export default defineConfig({
  testDir: 'tests/e2e',
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  outputDir: 'test-results',
  reporter: [['list']],
  use: {
    baseURL: process.env.E2E_BASE_URL ?? 'http://localhost:3000',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: [
        // Root has no user namespace to build the sandbox from.
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
})

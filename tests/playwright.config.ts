import path from 'node:path'
import { defineConfig, devices } from '@playwright/test'

const resultsDir = process.env.RESULTS_DIR

// The fixtures start the product and its fakes themselves, as `npm start` does, so there is no `webServer` here.
export default defineConfig({
  testDir: './e2e',
  outputDir: './.results/e2e',
  timeout: 120_000,
  expect: { timeout: 15_000 },
  workers: 1,
  fullyParallel: false,
  forbidOnly: Boolean(process.env.CI),
  reporter: resultsDir
    ? [['list'], ['json', { outputFile: path.join(resultsDir, 'e2e.json') }]]
    : [['list']],
  use: {
    ...devices['Desktop Chrome'],
    // The browser is the system's own; a channel would make Playwright look for another.
    channel: undefined,
    actionTimeout: 20_000,
    navigationTimeout: 40_000,
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
})

import { defineConfig } from '@playwright/test'
import { findChromium } from './scripts/lib/requirements.mjs'

const executablePath = findChromium()
if (executablePath === null) throw new Error('Chromium is missing on this machine: apt-get install chromium')

export default defineConfig({
  testDir: 'tests/e2e',
  globalSetup: './tests/support/e2e-server.ts',
  outputDir: 'test-results',
  workers: 2,
  fullyParallel: true,
  forbidOnly: Boolean(process.env.CI),
  // A browser on a busy machine can miss a beat; what needed a second try is printed as flaky.
  retries: 1,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list']],
  use: {
    locale: 'en-US',
    timezoneId: 'UTC',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath,
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

import { defineConfig } from '@playwright/test';

/** A real browser on the built product: Debian's Chromium, the real server, PostgreSQL and SMTP dialogue. */
export default defineConfig({
  testDir: '.',
  // The main job moves the server's clock, for all: it comes last.
  projects: [
    { name: 'today', testMatch: '**/*.story.ts', testIgnore: '**/main-job.story.ts' },
    { name: 'days later', testMatch: '**/main-job.story.ts' },
  ],
  outputDir: './results',
  globalSetup: './product.setup.ts',
  timeout: 120_000,
  expect: { timeout: 15_000 },
  fullyParallel: false,
  workers: 1,
  reporter: [['list']],
  use: {
    actionTimeout: 20_000,
    navigationTimeout: 30_000,
    viewport: { width: 390, height: 844 },
    locale: 'en-GB',
    timezoneId: 'Europe/Berlin',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: '/usr/bin/chromium',
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

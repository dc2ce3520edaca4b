import { readdirSync } from 'node:fs';
import { defineConfig } from '@playwright/test';
import { givenSeed, shuffled } from './scripts/shuffle.mjs';

const files = readdirSync(import.meta.dirname, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.spec.ts') && !name.startsWith('node_modules'))
  .toSorted();
const seed = givenSeed();

export default defineConfig({
  testDir: '.',
  // One after the other: the machine has two cores, and the browser, the server and the database share them.
  workers: 1,
  retries: 0,
  forbidOnly: process.env.CI !== undefined,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  outputDir: '../test-results',
  globalSetup: './support/cluster-setup.ts',
  reporter: [['list'], ['./scripts/playwright-count-reporter.mjs']],
  // A project for each file gives each file a worker, and with it a server and a database, of its own; and an order.
  projects: (seed === undefined ? files : shuffled(files, seed)).map((file) => ({
    name: file.replace(/\.spec\.ts$/, ''),
    testMatch: file,
  })),
  use: {
    browserName: 'chromium',
    viewport: { width: 1440, height: 900 },
    locale: 'en-GB',
    timezoneId: 'Europe/Dublin',
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
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

import { defineConfig } from '@playwright/test';
import { findChromium } from './scripts/find-chromium.ts';

/** Journeys through the built demo in a real browser; each file starts a server of its own. */
export default defineConfig({
  testDir: 'tests/browser',
  workers: 1,
  timeout: 120_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  retries: 0,
  use: {
    launchOptions: {
      executablePath: findChromium(),
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
    viewport: { width: 1440, height: 900 },
    trace: 'retain-on-failure',
  },
});

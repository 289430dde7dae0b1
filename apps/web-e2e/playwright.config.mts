import { fileURLToPath } from 'node:url';
import { defineConfig } from '@playwright/test';

const root = fileURLToPath(new URL('../..', import.meta.url));
const port = Number(process.env.E2E_PORT ?? 4310);
const baseURL = `http://127.0.0.1:${port}`;

/** A headless Chromium that asks nothing of the network beyond the page under test. */
const quietChromium = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export default defineConfig({
  testDir: './src',
  outputDir: `${root}dist/e2e/results`,
  reporter: [['list'], ['json', { outputFile: `${root}dist/reports/web-e2e.json` }]],
  // A walk waits for a hand’s pace most of its time.
  workers: 3,
  fullyParallel: true,
  forbidOnly: true,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL,
    viewport: { width: 1180, height: 820 },
    hasTouch: true,
    locale: 'en-US',
    timezoneId: 'America/Chicago',
    reducedMotion: 'reduce',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: quietChromium,
    },
  },
  projects: [
    { name: 'sign-in', testMatch: 'sign-in.setup.ts' },
    { name: 'chromium', testMatch: '*.spec.ts', dependencies: ['sign-in'] },
  ],
  webServer: {
    command: 'node apps/web-e2e/serve.mjs',
    cwd: root,
    url: `${baseURL}/api/health`,
    env: { PORT: String(port) },
    timeout: 30_000,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5_000 },
  },
});

import { existsSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { defineConfig } from '@playwright/test';

const port = 3100;
const root = path.resolve(import.meta.dirname, '..');
const dataDir = path.join(tmpdir(), `tubeplate-e2e-${String(process.ppid)}`);
const chromium =
  process.env['CHROMIUM'] ??
  ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'].find((file) =>
    existsSync(file),
  );

export default defineConfig({
  testDir: '.',
  outputDir: './results',
  fullyParallel: false,
  workers: 1,
  retries: 0,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  reporter: [
    ['list'],
    ...(process.env['BROWSER_REPORT']
      ? [['json', { outputFile: process.env['BROWSER_REPORT'] }] as const]
      : []),
  ],
  use: {
    baseURL: `http://localhost:${String(port)}`,
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    trace: 'retain-on-failure',
    launchOptions: {
      ...(chromium ? { executablePath: chromium } : {}),
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--no-first-run',
      ],
    },
  },
  webServer: {
    command: 'exec node --import tsx api/cli/start.ts',
    cwd: root,
    url: `http://localhost:${String(port)}/api/ready`,
    timeout: 240_000,
    reuseExistingServer: false,
    stdout: 'pipe',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 10_000 },
    env: {
      PORT: String(port),
      DATA_DIR: dataDir,
      DEMO: '1',
      RATE_FACTOR: '100',
      LOG_LEVEL: 'error',
      PUBLIC_URL: `http://localhost:${String(port)}`,
    },
  },
});

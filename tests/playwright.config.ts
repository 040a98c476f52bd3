import path from 'node:path';
import { defineConfig } from '@playwright/test';

const root = path.resolve(__dirname, '..');
const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium';
const port = Number(process.env.E2E_PORT ?? 3199);

export default defineConfig({
  testDir: path.join(root, 'tests', 'e2e'),
  outputDir: path.join(root, 'tests', '.out', 'playwright'),
  fullyParallel: false,
  workers: 2,
  retries: 0,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  reporter: process.env.PLAYWRIGHT_JSON_OUTPUT_NAME ? [['list'], ['json']] : [['list']],
  use: {
    baseURL: `http://localhost:${port}`,
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: chromium,
      args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--disable-dev-shm-usage'],
    },
  },
  webServer: {
    command: 'node tests/setup/serve.mjs',
    cwd: root,
    url: `http://localhost:${port}/api/health`,
    timeout: 240_000,
    reuseExistingServer: process.env.E2E_REUSE === '1',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5_000 },
    env: { E2E_PORT: String(port) },
  },
});

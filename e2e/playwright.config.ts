import { defineConfig } from '@playwright/test';

const port = Number(process.env.E2E_PORT ?? 4399);

/** One worker, the built server on a fresh database, Debian's Chromium. */
export default defineConfig({
  testDir: './flows',
  outputDir: '../test-results/e2e',
  timeout: 60_000,
  expect: { timeout: 10_000 },
  workers: 1,
  forbidOnly: true,
  reporter: [
    ['list'],
    ['json', { outputFile: process.env.PLAYWRIGHT_JSON_OUTPUT_FILE ?? '../test-results/browser.json' }],
  ],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    viewport: { width: 1440, height: 900 },
    browserName: 'chromium',
    acceptDownloads: true,
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
  webServer: {
    command: 'node --enable-source-maps dist/server/index.js',
    cwd: '..',
    url: `http://127.0.0.1:${port}/api/health`,
    reuseExistingServer: false,
    timeout: 30_000,
    env: {
      NODE_ENV: 'production',
      DEMO: '1',
      DEMO_PASSWORD: 'groundward-demo',
      SESSION_SECRET: 'only for the browser tests of this checkout',
      PORT: String(port),
      HOST: '127.0.0.1',
      DATABASE_URL: `sqlite:test-results/e2e-${Date.now()}.sqlite`,
    },
  },
});

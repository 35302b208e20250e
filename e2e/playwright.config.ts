import { fileURLToPath } from 'node:url'
import { defineConfig } from '@playwright/test'

const repository = fileURLToPath(new URL('..', import.meta.url))
const port = 4173

/** Drives the built page; `dist` must be there. */
export default defineConfig({
  testDir: '.',
  outputDir: '../test-results',
  fullyParallel: false,
  workers: 1,
  retries: 0,
  forbidOnly: true,
  reporter: 'list',
  timeout: 45_000,
  use: {
    baseURL: `http://localhost:${port}`,
    browserName: 'chromium',
    locale: 'en-GB',
    viewport: { width: 1280, height: 900 },
    serviceWorkers: 'block',
    launchOptions: {
      executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
      args: [
        '--headless',
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
    command: `npx vite preview --port ${port} --strictPort`,
    cwd: repository,
    url: `http://localhost:${port}`,
    reuseExistingServer: true,
    timeout: 30_000,
  },
})

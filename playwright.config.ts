import { defineConfig } from '@playwright/test'
import { chromiumFlags, chromiumPath } from './.config/scripts/chromium.ts'

/** Two schools on one machine that draw different numbers: what holds under one seed must hold under the other. */
const schools = [
  { name: 'alder', port: 4410 },
  { name: 'birch', port: 4420 },
]

export default defineConfig({
  testDir: 'site/e2e',
  outputDir: 'test-results',
  fullyParallel: false,
  workers: 2,
  forbidOnly: Boolean(process.env.CI),
  // Once more on a loaded machine; what passed only then is told as flaky.
  retries: process.env.CI ? 1 : 0,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  use: {
    viewport: { width: 1280, height: 900 },
    trace: 'retain-on-failure',
    launchOptions: { executablePath: chromiumPath, args: chromiumFlags },
  },
  projects: schools.map(({ name, port }, i) => ({
    name,
    // Only the learner's journey depends on what is drawn; the rest runs once.
    ...(i === 0 ? {} : { testMatch: /learner-journey\.spec\.ts/ }),
    use: { baseURL: `http://localhost:${port}` },
  })),
  webServer: schools.map(({ name, port }) => ({
    command: `rm -rf .cache/e2e/${name} && npm start`,
    url: `http://localhost:${port}/api/health`,
    env: {
      PORT: String(port),
      DATA_DIR: `.cache/e2e/${name}`,
      DRAW_SEED: name,
      DEMO: '1',
      NODE_ENV: 'test',
    },
    reuseExistingServer: !process.env.CI,
    timeout: 240_000,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 10_000 },
    stdout: 'ignore',
    stderr: 'pipe',
  })),
})

import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('..', import.meta.url))

/** One run for everything that needs no browser. `DEEP=1` lengthens the property tests (see `npm run test:deep`). */
export default defineConfig({
  root,
  test: {
    projects: [
      {
        root,
        test: {
          name: 'calc',
          setupFiles: ['calc/testing/setup.ts'],
          include: ['calc/**/*.test.ts'],
          environment: 'node',
          testTimeout: 60_000,
        },
      },
      { root, test: { name: 'content', include: ['content/**/*.test.ts'], environment: 'node', testTimeout: 60_000 } },
      {
        root,
        test: {
          name: 'api',
          include: ['api/**/*.spec.ts', 'api/**/*.e2e-spec.ts'],
          environment: 'node',
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      { root, test: { name: 'site', include: ['site/**/*.test.{ts,tsx}'], environment: 'node', testTimeout: 60_000 } },
    ],
  },
})

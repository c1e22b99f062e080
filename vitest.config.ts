import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url))
const alias = { '#shared': at('./shared'), '~': at('.') }

// Real processes, clocks and browsers on a shared machine: a test fails when it fails twice. What passes at the second try is told as such by the reporter.
const retry = process.env.CI === 'true' ? 1 : 0

export default defineConfig({
  test: {
    projects: [
      // pure: no mocks, no files
      { resolve: { alias }, test: { name: 'unit', include: ['tests/unit/**/*.test.ts'], environment: 'node', testTimeout: 60_000 } },
      // use cases on a temporary database file, real migrations, workers
      { resolve: { alias }, test: { name: 'integration', retry, include: ['tests/integration/**/*.test.ts', 'tests/bad-files/**/*.test.ts', 'tests/races/**/*.test.ts'], environment: 'node', env: { AUTH_SECRET: 'a secret of these tests' }, testTimeout: 30_000, hookTimeout: 60_000 } },
      // against the built server: started once by the files that need it
      { resolve: { alias }, test: { name: 'server', retry, include: ['tests/access/**/*.test.ts', 'tests/server/**/*.test.ts', 'tests/faults/**/*.test.ts'], environment: 'node', testTimeout: 60_000, hookTimeout: 240_000, fileParallelism: false } },
      // every page as each role, and the states that a page can be in
      { resolve: { alias }, test: { name: 'pages', retry, include: ['tests/pages/**/*.test.ts'], environment: 'node', testTimeout: 600_000, hookTimeout: 240_000, fileParallelism: false } },
      { resolve: { alias }, test: { name: 'browser', retry, include: ['tests/browser/**/*.test.ts'], environment: 'node', testTimeout: 240_000, hookTimeout: 240_000, fileParallelism: false } },
    ],
  },
})

import path from 'node:path'
import { defineConfig } from 'vitest/config'

const root = path.resolve(import.meta.dirname, '..')
const resultsDir = process.env.RESULTS_DIR
const resultsName = process.env.RESULTS_NAME ?? 'vitest'

// Five and three quarter hours off UTC: a rule that leans on the machine's own zone shows at once.
const awkwardZone = { TZ: 'Asia/Kathmandu' }

export default defineConfig({
  root,
  resolve: {
    alias: [
      { find: /^@\//, replacement: `${root}/` },
      { find: 'server-only', replacement: path.resolve(import.meta.dirname, 'setup/empty.ts') },
    ],
  },
  test: {
    environment: 'node',
    pool: 'forks',
    maxWorkers: 2,
    passWithNoTests: false,
    // Seconds on an idle machine; other work beside it must not fail a test.
    testTimeout: 60_000,
    reporters: resultsDir
      ? ['default', ['json', { outputFile: path.join(resultsDir, `${resultsName}.json`) }]]
      : ['default'],
    // Of the core only: every rule of the trade stands there. Measured when asked for (`--coverage`).
    coverage: {
      provider: 'v8',
      include: ['lib/domain/**'],
      reporter: ['text-summary', 'json-summary', ['text', { skipFull: true }]],
      reportsDirectory: path.join(resultsDir ?? root, 'coverage'),
      thresholds: { lines: 95, branches: 95 },
    },
    projects: [
      {
        extends: true,
        test: { name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}'], env: awkwardZone },
      },
      {
        extends: true,
        test: { name: 'outside', include: ['tests/outside/**/*.test.ts'], env: awkwardZone },
      },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          globalSetup: ['tests/setup/migrated-template.ts'],
          // One database for each worker, opened once: three times faster than one for each file.
          isolate: false,
          hookTimeout: 90_000,
        },
      },
    ],
  },
})

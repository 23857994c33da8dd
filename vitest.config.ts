import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('.', import.meta.url))

/** Three projects: pure code runs in parallel; what touches the database runs one file at a time. */
export default defineConfig({
  resolve: {
    alias: [
      { find: /^@\//, replacement: root },
      { find: 'server-only', replacement: `${root}tests/support/serverOnly.ts` },
    ],
  },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['tests/{science,panel,domain,format,writing,pdf,app,services,scripts}/**/*.test.ts'],
          environment: 'node',
          // A guard against a test that hangs, not a measure: on a busy machine a property of a thousand cases takes seconds.
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'components',
          include: ['tests/components/**/*.test.tsx'],
          environment: 'jsdom',
          testTimeout: 30_000,
          setupFiles: ['tests/support/components.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/{db,integration}/**/*.test.ts'],
          environment: 'node',
          fileParallelism: false,
          testTimeout: 30_000,
          hookTimeout: 60_000,
          setupFiles: ['tests/support/integration.ts'],
        },
      },
    ],
  },
})

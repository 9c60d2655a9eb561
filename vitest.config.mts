import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = { '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, '') }
/** A stand-in for the marker package, which refuses to load outside a server bundle. */
const serverOnly = { 'server-only': fileURLToPath(new URL('tests/support/server-only.ts', import.meta.url)) }

/** Projects that work on the database share it, one file at a time. */
const onDatabase = {
  environment: 'node',
  fileParallelism: false,
  globalSetup: 'tests/support/needs-database.ts',
  testTimeout: 60_000,
  hookTimeout: 60_000,
} as const

/** Unit tests and laws need nothing but Node; the rest needs what scripts/test.mjs brings up. */
export default defineConfig({
  resolve: { alias: { ...alias, ...serverOnly } },
  test: {
    projects: [
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: {
          name: 'unit',
          include: ['tests/{drafting,components,app,db,scripts}/**/*.test.{ts,tsx}'],
          environment: 'node',
          setupFiles: ['tests/support/properties.ts'],
          // Property tests share two cores with whatever else the machine does.
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: {
          name: 'laws',
          include: ['tests/{laws,reference}/**/*.test.ts'],
          environment: 'node',
          setupFiles: ['tests/support/properties.ts'],
          testTimeout: 300_000,
        },
      },
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: {
          name: 'integration',
          include: ['tests/{integration,print}/**/*.test.ts'],
          ...onDatabase,
        },
      },
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: { name: 'security', include: ['tests/security/**/*.test.ts'], ...onDatabase },
      },
    ],
  },
})

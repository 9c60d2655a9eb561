import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = { '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, '') }
/** A stand-in for the marker package, which refuses to load outside a server bundle. */
const serverOnly = { 'server-only': fileURLToPath(new URL('tests/support/server-only.ts', import.meta.url)) }

/** Unit tests need nothing but Node; integration tests need the database that scripts/test.mjs starts. */
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
        },
      },
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: {
          name: 'laws',
          include: ['tests/{laws,reference}/**/*.test.ts'],
          environment: 'node',
          testTimeout: 300_000,
        },
      },
      {
        resolve: { alias: { ...alias, ...serverOnly } },
        test: {
          name: 'integration',
          include: ['tests/{integration,security,print}/**/*.test.ts'],
          environment: 'node',
          fileParallelism: false,
          testTimeout: 60_000,
        },
      },
    ],
  },
})

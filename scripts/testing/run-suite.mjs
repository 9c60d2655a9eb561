import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { readJson } from '../local/json-file.mjs'
import { root } from '../local/paths.mjs'
import { attempt } from '../local/processes.mjs'
import { tallyPlaywright, tallyVitest } from './tally.mjs'

/**
 * Runs one suite, its own report on the terminal, and counts it.
 * @param {string} suite a vitest project, or e2e
 * @param {{ filters: string[], folder: string, env: NodeJS.ProcessEnv }} options folder: where its report is written
 * @returns {Promise<import('./tally.mjs').Tally>}
 */
export async function runSuite(suite, { filters, folder, env }) {
  const report = join(folder, `report-${suite}.json`)
  rmSync(report, { force: true })
  const [command, count] = suite === 'e2e' ? [playwright, tallyPlaywright] : [vitest, tallyVitest]
  const { code } = await attempt(process.execPath, command(suite, filters, report), {
    quiet: false,
    cwd: root,
    env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
  })
  return count(readReport(report), code)
}

function vitest(suite, filters, report) {
  return [
    join(root, 'node_modules', 'vitest', 'vitest.mjs'),
    'run',
    `--project=${suite}`,
    '--reporter=default',
    '--reporter=json',
    // What a passing test prints (a database killed on purpose, say) would only bury what a failing one does.
    '--silent=passed-only',
    `--outputFile.json=${report}`,
    // A suite without a file of this name is no failure when several suites are asked; test.mjs sees to "none at all".
    '--passWithNoTests',
    ...filters,
  ]
}

function playwright(_suite, filters) {
  return [
    join(root, 'node_modules', '@playwright', 'test', 'cli.js'),
    'test',
    '--pass-with-no-tests',
    ...filters,
  ]
}

function readReport(path) {
  try {
    return readJson(path)
  } catch {
    return undefined
  }
}

import { SetUpError } from '../local/say.mjs'

/** In the order they run: the quick ones first. */
export const suiteNames = ['unit', 'laws', 'integration', 'security', 'e2e']

/** What each suite needs beside Node. */
const needs = {
  unit: {},
  laws: {},
  integration: { database: true },
  security: { database: true, app: true },
  e2e: { database: true, app: true },
}

/**
 * Reads `npm test -- [suite …] [part of a file name …] [--keep] [--dev]`.
 * @param {string[]} words
 * @returns {{ suites: string[], filters: string[], keep: boolean, dev: boolean, database: boolean, app: boolean }}
 *   keep: the database keeps what the last run left in it; dev: serve from the sources instead of a build
 */
export function readArguments(words) {
  const options = words.filter((word) => word.startsWith('--'))
  const unknown = options.find((option) => option !== '--keep' && option !== '--dev')
  if (unknown) throw new SetUpError(`Unknown option ${unknown}. There are --keep and --dev.`)
  const named = suiteNames.filter((name) => words.includes(name))
  const suites = named.length > 0 ? named : suiteNames
  return {
    suites,
    filters: words.filter((word) => !word.startsWith('--') && !suiteNames.includes(word)),
    keep: options.includes('--keep'),
    dev: options.includes('--dev'),
    database: suites.some((suite) => needs[suite].database),
    app: suites.some((suite) => needs[suite].app),
  }
}

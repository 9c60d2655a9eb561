import { expect, test } from 'vitest'
import { readArguments } from '../../scripts/testing/arguments.mjs'

test('without words every suite runs', () => {
  expect(readArguments([])).toMatchObject({
    suites: ['unit', 'laws', 'integration', 'security', 'e2e'],
    filters: [],
    keep: false,
  })
})

test('names of suites narrow the run, other words narrow the files', () => {
  expect(readArguments(['e2e', 'share', '--dev'])).toMatchObject({
    suites: ['e2e'],
    filters: ['share'],
    dev: true,
    app: true,
  })
})

test('unit tests ask for no database', () => {
  expect(readArguments(['unit', 'laws'])).toMatchObject({ database: false, app: false })
})

test('a mistyped option is refused with the ones there are', () => {
  expect(() => readArguments(['--kep'])).toThrow('Unknown option --kep. There are --keep and --dev.')
})

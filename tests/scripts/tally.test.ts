import { expect, test } from 'vitest'
import { tallyPlaywright, tallyVitest, total } from '../../scripts/testing/tally.mjs'

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((status) => ({ status })),
})

test('a file that cannot be loaded counts as a failure', () => {
  const report = {
    numPassedTests: 3,
    numFailedTests: 0,
    testResults: [file('passed', 'passed'), file('failed')],
  }
  expect(tallyVitest(report, 1)).toEqual({ passed: 3, failed: 1, skipped: 0 })
})

test('a run that breaks off without a report counts as a failure', () => {
  expect(tallyVitest(undefined, 'SIGKILL').failed).toBe(1)
  expect(tallyPlaywright(undefined, 1).failed).toBe(1)
})

test('a browser test that passes only at the second try counts as failed', () => {
  const report = { stats: { expected: 4, unexpected: 1, flaky: 2, skipped: 0 } }
  expect(tallyPlaywright(report, 1)).toEqual({ passed: 4, failed: 3, skipped: 0 })
})

test('suites add up', () => {
  const one = { passed: 400, failed: 0, skipped: 0 }
  const two = { passed: 12, failed: 1, skipped: 2 }
  expect(total([one, two])).toEqual({ passed: 412, failed: 1, skipped: 2 })
})

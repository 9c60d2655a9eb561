/** @typedef {{ passed: number, failed: number, skipped: number }} Tally */

/**
 * Counts a vitest JSON report. A file that could not be loaded, and a run that ended badly without a failed test,
 * are failures too: nothing may fail without being counted.
 * @param {any} report as `--reporter=json` writes it; undefined when the run wrote none
 * @param {number | string} exitCode of the run
 * @returns {Tally}
 */
export function tallyVitest(report, exitCode) {
  const files = report?.testResults ?? []
  const unloaded = files.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(({ status }) => status !== 'failed'),
  )
  const tally = {
    passed: report?.numPassedTests ?? 0,
    failed: (report?.numFailedTests ?? 0) + unloaded.length,
    skipped: (report?.numPendingTests ?? 0) + (report?.numTodoTests ?? 0),
  }
  return withExitCode(tally, exitCode)
}

/**
 * Counts a Playwright JSON report.
 * @param {any} report as its JSON reporter writes it; undefined when the run wrote none
 * @param {number | string} exitCode of the run
 * @returns {Tally}
 */
export function tallyPlaywright(report, exitCode) {
  const { expected = 0, unexpected = 0, flaky = 0, skipped = 0 } = report?.stats ?? {}
  return withExitCode({ passed: expected, failed: unexpected + flaky, skipped }, exitCode)
}

function withExitCode(tally, exitCode) {
  return exitCode !== 0 && tally.failed === 0 ? { ...tally, failed: 1 } : tally
}

/** @param {Tally[]} tallies */
export function total(tallies) {
  const sum = (field) => tallies.reduce((so, tally) => so + tally[field], 0)
  return { passed: sum('passed'), failed: sum('failed'), skipped: sum('skipped') }
}

/**
 * `npm test -- [suite …] [part of a file name …] [--keep] [--dev]`: brings up what the suites need beside whatever
 * runs already, runs them and counts. The last line is `N passed, M failed`.
 */
import { ensureModules } from './local/modules.mjs'
import { runMain, say, SetUpError } from './local/say.mjs'
import { createStopping } from './local/stopping.mjs'
import { readArguments } from './testing/arguments.mjs'
import { runSuite } from './testing/run-suite.mjs'
import { takeSlot } from './testing/slot.mjs'
import { total } from './testing/tally.mjs'
import { bringUpApp } from './testing/test-app.mjs'
import { bringUpDatabase, testEnvironment } from './testing/test-database.mjs'

await runMain(async () => {
  const asked = readArguments(process.argv.slice(2))
  const stopping = createStopping()
  const slot = takeSlot()
  stopping.onStop(slot.release)
  const tallies = []
  try {
    await ensureModules()
    const env = asked.database
      ? await bringUpDatabase({ folder: slot.folder, stopping, keep: asked.keep })
      : testEnvironment()
    let served = false
    for (const suite of asked.suites) {
      if (!served && (suite === 'security' || suite === 'e2e')) {
        await bringUpApp({ folder: slot.folder, env, stopping, dev: asked.dev })
        served = true
      }
      say(`\n── ${suite}`)
      tallies.push(await runSuite(suite, { filters: asked.filters, folder: slot.folder, env }))
      if (stopping.stopping) break
    }
  } catch (error) {
    // What could not be brought up has failed, and is counted.
    process.stderr.write(`\n${error instanceof SetUpError ? error.message : error.stack}\n`)
    tallies.push({ passed: 0, failed: 1, skipped: 0 })
  } finally {
    await stopping.stop()
  }
  return conclude(total(tallies), asked.filters)
})

function conclude({ passed, failed, skipped }, filters) {
  if (passed + failed === 0 && filters.length > 0) say(`No test file matches ${filters.join(', ')}.`)
  if (skipped > 0) say(`${skipped} skipped`)
  const nothing = passed + failed === 0
  say(`\n${passed} passed, ${failed} failed`)
  return failed > 0 || nothing ? 1 : 0
}

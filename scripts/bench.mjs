/**
 * `npm run bench [-- part of a file name]`: runs every tests/bench/*.bench.mts in a process of its own, one after the
 * other, and prints one table. Ratios are taken within a file, that is within one run on one machine.
 */
import { existsSync, readdirSync } from 'node:fs'
import { cpus } from 'node:os'
import { join } from 'node:path'
import { ensureModules } from './local/modules.mjs'
import { root } from './local/paths.mjs'
import { attempt } from './local/processes.mjs'
import { runMain, say, SetUpError } from './local/say.mjs'
import { createStopping } from './local/stopping.mjs'
import { alignedTable, benchHeadings, benchRows } from './testing/bench-table.mjs'
import { takeSlot } from './testing/slot.mjs'
import { bringUpDatabase } from './testing/test-database.mjs'

const folder = join(root, 'tests', 'bench')

await runMain(async () => {
  const filters = process.argv.slice(2)
  const files = (existsSync(folder) ? readdirSync(folder) : [])
    .filter(
      (name) =>
        name.endsWith('.bench.mts') && (filters.length === 0 || filters.some((part) => name.includes(part))),
    )
    .sort()
  if (files.length === 0) throw new SetUpError(`No file in tests/bench matches ${filters.join(', ')}.`)
  const stopping = createStopping()
  const slot = takeSlot()
  stopping.onStop(slot.release)
  try {
    await ensureModules()
    const env = await bringUpDatabase({ folder: slot.folder, stopping, keep: false })
    const rows = []
    let failed = 0
    for (const file of files) {
      say(`${file} …`)
      const results = await runBench(file, env)
      if (results) rows.push(...benchRows(results))
      else failed++
    }
    say(`\n${cpus().length} × ${cpus()[0]?.model ?? 'processor'}, Node ${process.version}\n`)
    for (const line of alignedTable(benchHeadings, rows)) say(line)
    return failed > 0 ? 1 : 0
  } finally {
    await stopping.stop()
  }
})

async function runBench(file, env) {
  const args = ['--import', 'tsx', '--conditions=react-server', join(folder, file)]
  const { code, stdout, stderr } = await attempt(process.execPath, args, { cwd: root, env })
  const lines = stdout.split('\n')
  if (code !== 0) {
    say(`${file} failed:\n${stderr.trim()}`)
    return undefined
  }
  return lines.filter((line) => line.startsWith('BENCH ')).map((line) => JSON.parse(line.slice(6)))
}

/**
 * `npm run mutate`: breaks the drafting engine on purpose, one fault at a time, and asks the law that ought to notice.
 * Ends with how many were noticed; fails with the list of those that were not. Needs neither database nor build.
 */
import { spawn } from 'node:child_process'
import { availableParallelism } from 'node:os'
import { join } from 'node:path'
import { ensureModules } from './local/modules.mjs'
import { root } from './local/paths.mjs'
import { runMain, say } from './local/say.mjs'

await runMain(async () => {
  await ensureModules()
  const parts = Math.min(4, Math.max(1, availableParallelism()))
  const verdicts = (
    await Promise.all(Array.from({ length: parts }, (_, which) => judge(which, parts)))
  ).flat()
  if (verdicts.some((verdict) => verdict === undefined)) return 1
  const unnoticed = verdicts.filter(({ caught }) => caught === undefined)
  for (const { mutant, caught } of verdicts.sort((a, b) => a.mutant.law - b.mutant.law)) {
    say(`law ${mutant.law}: ${mutant.name} – ${caught ?? 'NOT NOTICED'}`)
  }
  say(`\n${verdicts.length - unnoticed.length} of ${verdicts.length} faults noticed by their law`)
  for (const { mutant } of unnoticed)
    say(`Not noticed by law ${mutant.law}: ${mutant.name} (drafting/${mutant.file})`)
  return unnoticed.length === 0 ? 0 : 1
})

/** One process's share of the faults. @returns {Promise<object[]>} its verdicts; one undefined when it could not judge */
function judge(which, parts) {
  return new Promise((resolve) => {
    const file = join(root, 'tests', 'mutation', 'part.ts')
    const child = spawn(process.execPath, ['--import', 'tsx', file, root, String(which), String(parts)], {
      cwd: root,
      stdio: ['ignore', 'pipe', 'inherit'],
    })
    let output = ''
    child.stdout.setEncoding('utf8').on('data', (text) => (output += text))
    child.on('close', (code) => resolve(code === 0 ? JSON.parse(output) : [undefined]))
  })
}

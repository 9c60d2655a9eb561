/** `npm run check`: everything about the sources that needs no database and no browser, in under a minute. */
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { ensureModules } from './local/modules.mjs'
import { root } from './local/paths.mjs'
import { attempt } from './local/processes.mjs'
import { runMain, say } from './local/say.mjs'

const bin = (name) => join(root, 'node_modules', '.bin', name)

/**
 * Each step is a chain of commands; two chains run at a time, the long ones first.
 * @type {{ name: string, commands: [string, ...string[]][] }[]}
 */
const steps = [
  {
    name: 'lint',
    commands: [
      [
        bin('eslint'),
        '.',
        '--max-warnings=0',
        '--cache',
        '--cache-location=.cache/eslint',
        '--cache-strategy=content',
      ],
    ],
  },
  {
    name: 'types',
    commands: [
      [bin('next'), 'typegen'],
      [bin('tsc'), '--noEmit'],
    ],
  },
  {
    name: 'types of the engine, without the browser',
    commands: [[bin('tsc'), '--noEmit', '-p', 'drafting']],
  },
  {
    name: 'import rules',
    commands: [
      [
        bin('depcruise'),
        '--config',
        '.dependency-cruiser.mjs',
        'app',
        'components',
        'db',
        'drafting',
        'migrations',
      ],
    ],
  },
  {
    name: 'format',
    commands: [
      [bin('prettier'), '--check', '.', '--log-level=warn', '--cache', '--cache-location=.cache/prettier'],
    ],
  },
  { name: 'unused files, exports and packages', commands: [[bin('knip'), '--no-progress']] },
  {
    name: 'unit tests',
    commands: [[bin('vitest'), 'run', '--project=unit', '--reporter=dot', '--silent=passed-only']],
  },
]

await runMain(async () => {
  await ensureModules()
  mkdirSync(join(root, '.cache'), { recursive: true })
  const waiting = [...steps]
  const failed = []
  const worker = async () => {
    for (let step = waiting.shift(); step; step = waiting.shift())
      if (!(await passes(step))) failed.push(step.name)
  }
  await Promise.all([worker(), worker()])
  say(failed.length === 0 ? '\nAll checks passed.' : `\nFailed: ${failed.join('; ')}.`)
  return failed.length === 0 ? 0 : 1
})

async function passes({ name, commands }) {
  const started = Date.now()
  for (const [command, ...args] of commands) {
    const { code, stdout, stderr } = await attempt(command, args, {
      cwd: root,
      env: { ...process.env, NO_COLOR: '1' },
    })
    if (code === 0) continue
    say(`✗ ${name}\n${(stdout + stderr).trim()}\n`)
    return false
  }
  say(`✓ ${name} (${((Date.now() - started) / 1000).toFixed(1)} s)`)
  return true
}

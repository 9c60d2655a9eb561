import { spawnSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { expect, it } from 'vitest'

const root = fileURLToPath(new URL('../..', import.meta.url))

it('every fault put into the engine on purpose is noticed by the law that names it', () => {
  const { status, stdout, stderr } = spawnSync(process.execPath, ['scripts/mutate.mjs'], {
    cwd: root,
    encoding: 'utf8',
  })
  expect(status, `${stdout.split('\n').slice(-12).join('\n')}${stderr}`).toBe(0)
  const [, noticed, all] = /(\d+) of (\d+) faults noticed/.exec(stdout) ?? []
  expect(noticed).toBe(all)
  expect(Number(all)).toBeGreaterThanOrEqual(25)
})

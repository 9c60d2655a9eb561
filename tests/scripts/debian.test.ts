import { chmodSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { delimiter, join } from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { ensureCommands } from '../../scripts/local/debian.mjs'

/** A package manager that writes down what it is told and "installs" a command of the package's name. */
const packageManager = `#!/bin/sh
echo "$@" >> "$(dirname "$0")/told"
[ "$1" = install ] && [ -z "$BROKEN" ] && printf '#!/bin/sh\\n' > "$(dirname "$0")/zz-walker" && chmod +x "$(dirname "$0")/zz-walker"
exit 0
`
const path = process.env.PATH
let folder: string

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'chalkfold-packages-'))
  for (const [name, text] of [
    ['apt-get', packageManager],
    // Stands for a real sudo where the tests are not run as root.
    ['sudo', '#!/bin/sh\nshift\nexec "$@"\n'],
  ] as const) {
    writeFileSync(join(folder, name), text)
    chmodSync(join(folder, name), 0o755)
  }
  process.env.PATH = `${folder}${delimiter}${path}`
})

afterEach(() => {
  process.env.PATH = path
  delete process.env.BROKEN
  rmSync(folder, { recursive: true })
})

test('a missing command is installed from its package, without recommended extras', async () => {
  await ensureCommands(['zz-walker', 'sh'], { 'zz-walker': 'seam-walker', sh: 'shell' })
  expect(readFileSync(join(folder, 'told'), 'utf8').trim().split('\n')).toEqual([
    'update -q',
    'install -y --no-install-recommends seam-walker',
  ])
})

test('nothing is asked of the package manager while every command is there', async () => {
  await ensureCommands(['sh'], { sh: 'shell' })
  expect(() => readFileSync(join(folder, 'told'))).toThrow('ENOENT')
})

test('a package that does not bring its command is reported', async () => {
  process.env.BROKEN = '1'
  await expect(ensureCommands(['zz-walker'], { 'zz-walker': 'seam-walker' })).rejects.toThrow(
    'seam-walker installed, but zz-walker is not there.',
  )
})

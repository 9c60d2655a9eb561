/**
 * `npm run review`: draws every garment on five bodies and in its main styles into `.cache/review`, one PNG each, to be looked
 * at the way a cutter would. What was seen is written down in `scripts/review/seen.md`.
 */
import { spawnSync } from 'node:child_process'
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './local/paths.mjs'

const folder = join(root, '.cache', 'review')
mkdirSync(folder, { recursive: true })
const { status } = spawnSync(
  process.execPath,
  ['--import', 'tsx', join(root, 'scripts', 'review', 'sheets.mts'), folder],
  { cwd: root, stdio: 'inherit' },
)
process.exitCode = status ?? 1

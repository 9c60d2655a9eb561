import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

/** Contents of a small JSON file, or undefined when there is none. */
export function readJson(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined
}

/** Writes a JSON file that only this account can read, whole or not at all. */
export function writeJson(path, value) {
  mkdirSync(dirname(path), { recursive: true, mode: 0o700 })
  const half = `${path}.${process.pid}.new`
  writeFileSync(half, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 })
  renameSync(half, path)
}

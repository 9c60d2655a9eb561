import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'
import { readJson } from './json-file.mjs'
import { beginningOf, isAlive } from './processes.mjs'

/**
 * Takes a folder or a task for this process. A lock left by a process that has died is taken over.
 * @param {string} path of the lock file
 * @returns {{ release: () => void } | { holder: number }} holder: the process that has it now
 */
export function takeLock(path) {
  mkdirSync(dirname(path), { recursive: true, mode: 0o700 })
  for (let attempt = 0; attempt < 2; attempt++) {
    try {
      writeFileSync(path, JSON.stringify({ pid: process.pid, began: beginningOf(process.pid) }), {
        flag: 'wx',
        mode: 0o600,
      })
      return { release: () => rmSync(path, { force: true }) }
    } catch (error) {
      if (error.code !== 'EEXIST') throw error
    }
    const holder = livingHolder(path)
    if (holder !== undefined) return { holder }
    rmSync(path, { force: true })
  }
  return { holder: livingHolder(path) ?? 0 }
}

/** Id of the process that has the lock, unless it has died and, perhaps, its number gone to another. */
function livingHolder(path) {
  try {
    const { pid, began } = readJson(path)
    return isAlive(pid) && beginningOf(pid) === began ? pid : undefined
  } catch {
    return undefined
  }
}

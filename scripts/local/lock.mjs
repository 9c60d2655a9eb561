import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'
import { readJson } from './json-file.mjs'
import { isAlive } from './processes.mjs'

/**
 * Takes a folder or a task for this process. A lock left by a process that has died is taken over.
 * @param {string} path of the lock file
 * @returns {{ release: () => void } | { holder: number }} holder: the process that has it now
 */
export function takeLock(path) {
  mkdirSync(dirname(path), { recursive: true, mode: 0o700 })
  for (let attempt = 0; attempt < 2; attempt++) {
    try {
      writeFileSync(path, JSON.stringify({ pid: process.pid }), { flag: 'wx', mode: 0o600 })
      return { release: () => rmSync(path, { force: true }) }
    } catch (error) {
      if (error.code !== 'EEXIST') throw error
    }
    const holder = holderOf(path)
    if (holder !== undefined && isAlive(holder)) return { holder }
    rmSync(path, { force: true })
  }
  return { holder: holderOf(path) ?? 0 }
}

function holderOf(path) {
  try {
    return readJson(path)?.pid
  } catch {
    return undefined
  }
}

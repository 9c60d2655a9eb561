import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { run } from './processes.mjs'
import { root } from './paths.mjs'
import { say } from './say.mjs'

/**
 * Whether node_modules holds what package-lock.json asks for. npm leaves a list of what it installed inside
 * node_modules, last of all; packages for other machines are absent from it by right.
 * @param {{ packages: Record<string, { version?: string, integrity?: string, optional?: boolean }> }} wanted
 * @param {{ packages: Record<string, { version?: string, integrity?: string }> } | undefined} installed
 */
export function modulesMatch(wanted, installed) {
  if (!installed) return false
  return Object.entries(wanted.packages).every(([path, entry]) => {
    if (path === '' || entry.link) return true
    const found = installed.packages[path]
    if (!found) return entry.optional === true || entry.devOptional === true
    return found.version === entry.version && found.integrity === entry.integrity
  })
}

/** Runs `npm ci` when node_modules is missing or the lock has changed. */
export async function ensureModules(folder = root) {
  const wanted = JSON.parse(readFileSync(join(folder, 'package-lock.json'), 'utf8'))
  const list = join(folder, 'node_modules', '.package-lock.json')
  const installed = existsSync(list) ? JSON.parse(readFileSync(list, 'utf8')) : undefined
  if (modulesMatch(wanted, installed)) return
  say('Installing node packages (npm ci), about a minute …')
  await run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], { cwd: folder, quiet: true })
}

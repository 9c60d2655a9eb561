import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { takeLock } from './lock.mjs'
import { root } from './paths.mjs'
import { run } from './processes.mjs'
import { say } from './say.mjs'

/** Top-level entries that the built application does not depend on. Dotted ones are left out too. */
const notSources = new Set([
  'node_modules',
  'tests',
  'scripts',
  'docs',
  'migrations',
  'test-results',
  'coverage',
])

/**
 * One number for everything a build depends on: the sources, the packages and Node itself.
 * @param {string} folder top of the checkout
 */
export function sourceHash(folder = root) {
  const hash = createHash('sha256').update(process.version)
  for (const name of readdirSync(folder).sort()) {
    if (
      name.startsWith('.') ||
      notSources.has(name) ||
      /\.(md|tsbuildinfo)$/.test(name) ||
      name === 'next-env.d.ts'
    )
      continue
    addToHash(hash, folder, name)
  }
  return hash.digest('hex')
}

function addToHash(hash, folder, name) {
  const path = join(folder, name)
  let entries
  try {
    entries = readdirSync(path).sort()
  } catch (error) {
    if (error.code !== 'ENOTDIR') throw error
    hash.update(`${path}\0`).update(readFileSync(path)).update('\0')
    return
  }
  for (const entry of entries) addToHash(hash, path, entry)
}

/**
 * Builds the application unless the folder holds a build of exactly these sources.
 * @param {string} distDir folder of the build, relative to the checkout: `.next`, or `.next-test` for tests
 * @param {NodeJS.ProcessEnv} env
 */
export async function ensureBuild(distDir, env) {
  const lock = await waitForLock(join(root, '.cache', `build${distDir}.lock`))
  try {
    const mark = join(root, distDir, 'source-hash')
    const wanted = sourceHash()
    if (existsSync(mark) && readFileSync(mark, 'utf8') === wanted) return
    say('Building the application, about a minute …')
    await run(process.execPath, [nextCommand, 'build'], {
      quiet: true,
      cwd: root,
      env: { ...env, NODE_ENV: 'production', NEXT_DIST_DIR: distDir, NEXT_TELEMETRY_DISABLED: '1' },
    })
    writeFileSync(mark, wanted)
  } finally {
    lock.release()
  }
}

/** The framework's own command line. */
export const nextCommand = join(root, 'node_modules', 'next', 'dist', 'bin', 'next')

async function waitForLock(path) {
  for (let said = false; ; said = true) {
    const lock = takeLock(path)
    if (lock.release) return lock
    if (!said) say(`Another run (process ${lock.holder}) is building; waiting for it …`)
    await sleep(500)
  }
}

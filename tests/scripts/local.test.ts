import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { socketFolder } from '../../db/local/socket-folder.mjs'
import { sourceHash } from '../../scripts/local/build.mjs'
import { readEnvFile } from '../../scripts/local/env-file.mjs'
import { takeLock } from '../../scripts/local/lock.mjs'
import { modulesMatch } from '../../scripts/local/modules.mjs'
import { openSettings } from '../../scripts/local/settings.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'chalkfold-local-'))
})
afterEach(() => rmSync(folder, { recursive: true, force: true }))

describe('settings', () => {
  test('secrets are made once, differ between installations, and only their owner can read them', () => {
    const first = openSettings(join(folder, 'a')).settings
    expect(openSettings(join(folder, 'a')).settings).toEqual(first)
    expect(openSettings(join(folder, 'b')).settings.sessionSecret).not.toBe(first.sessionSecret)
    expect(first.sessionSecret.length).toBeGreaterThanOrEqual(43)
    expect(statSync(join(folder, 'a', 'settings.json')).mode & 0o077).toBe(0)
  })

  test('what the shell sets wins over the settings file, and an empty line sets nothing', () => {
    writeFileSync(join(folder, '.env'), 'PORT=4000\nSMTP_URL=\nMAIL_FROM="Ada <ada@example.test>"\n')
    const env: Record<string, string> = { PORT: '5000' }
    readEnvFile(join(folder, '.env'), env as NodeJS.ProcessEnv)
    expect(env).toEqual({ PORT: '5000', MAIL_FROM: 'Ada <ada@example.test>' })
  })
})

describe('lock', () => {
  test('one process has it at a time', () => {
    const path = join(folder, 'x.lock')
    const first = takeLock(path)
    expect(takeLock(path)).toEqual({ holder: process.pid })
    if ('release' in first) first.release()
    expect(takeLock(path)).toHaveProperty('release')
  })

  test('one left by a process that died is taken over', () => {
    const path = join(folder, 'x.lock')
    writeFileSync(path, JSON.stringify({ pid: 2 ** 22 + 1 }))
    expect(takeLock(path)).toHaveProperty('release')
    expect(JSON.parse(readFileSync(path, 'utf8'))).toMatchObject({ pid: process.pid })
  })

  test('one whose number has gone to another process since is taken over', () => {
    const path = join(folder, 'x.lock')
    writeFileSync(path, JSON.stringify({ pid: process.pid, began: '1' }))
    expect(takeLock(path)).toHaveProperty('release')
  })
})

describe('what is stale', () => {
  const wanted = {
    packages: {
      '': { version: '1.0.0' },
      'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
      'node_modules/for-other-machines': { version: '2.0.0', integrity: 'sha512-o', optional: true },
    },
  }

  test('packages of other machines may be absent', () => {
    const installed = { packages: { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' } } }
    expect(modulesMatch(wanted, installed)).toBe(true)
  })

  test('a changed, missing or never finished package calls for an installation', () => {
    const changed = { packages: { 'node_modules/a': { version: '1.0.1', integrity: 'sha512-b' } } }
    expect(modulesMatch(wanted, changed)).toBe(false)
    expect(modulesMatch(wanted, { packages: {} })).toBe(false)
    expect(modulesMatch(wanted, undefined)).toBe(false)
  })

  test('a build is stale when a source changes, not when a test or a document does', () => {
    for (const name of ['app', 'tests']) mkdirSync(join(folder, name))
    writeFileSync(join(folder, 'app', 'page.tsx'), 'one')
    const before = sourceHash(folder)
    writeFileSync(join(folder, 'tests', 'page.test.ts'), 'new')
    writeFileSync(join(folder, 'README.md'), 'new')
    expect(sourceHash(folder)).toBe(before)
    writeFileSync(join(folder, 'app', 'page.tsx'), 'two')
    expect(sourceHash(folder)).not.toBe(before)
  })
})

describe('socket', () => {
  test('it stands beside the data while its path is short enough for the system', () => {
    expect(socketFolder(folder, undefined)).toBe(join(folder, 'run'))
  })

  test('in a deep checkout it moves to a short private folder, and stays there', () => {
    const deep = join(folder, 'deep'.repeat(30))
    const short = socketFolder(deep, undefined)
    expect(Buffer.byteLength(join(short, 'm.sock'))).toBeLessThan(107)
    expect(statSync(short).mode & 0o077).toBe(0)
    expect(socketFolder(deep, short)).toBe(short)
    rmSync(short, { recursive: true })
  })
})

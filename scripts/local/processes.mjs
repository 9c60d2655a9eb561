import { spawn } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { accessSync, constants } from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'
import { SetUpError } from './say.mjs'

/** Where Debian keeps servers that an ordinary account does not have in its PATH. */
const systemFolders = ['/usr/sbin', '/usr/local/sbin', '/sbin', '/usr/bin', '/usr/local/bin']

/** Full path of a command, or undefined when it is not installed. */
export function findCommand(name) {
  for (const folder of [...(process.env.PATH ?? '').split(delimiter), ...systemFolders]) {
    const path = join(folder, name)
    try {
      accessSync(path, constants.X_OK)
      return path
    } catch {
      // Not in this folder.
    }
  }
  return undefined
}

/**
 * Runs a command to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {{ quiet?: boolean, input?: string | Buffer } & import('node:child_process').SpawnOptions} [options]
 *   quiet: keep the output for the error message instead of showing it
 * @returns {Promise<string>} what it wrote to stdout when quiet, otherwise ''
 * @throws {SetUpError} with the end of its output when it fails
 */
export async function run(command, args, { quiet = false, input, ...options } = {}) {
  const { code, stdout, stderr } = await attempt(command, args, { quiet, input, ...options })
  if (code === 0) return stdout
  const said = (stderr + stdout).trim().split('\n').slice(-25).join('\n')
  throw new SetUpError(`${[command, ...args].join(' ')} failed (${code}).${said ? `\n${said}` : ''}`)
}

/** Like run, but resolves to the exit code and output instead of throwing. */
export function attempt(command, args, { quiet = true, input, ...options } = {}) {
  const stdin = input === undefined ? 'ignore' : 'pipe'
  const stdio = quiet ? [stdin, 'pipe', 'pipe'] : [stdin, 'inherit', 'inherit']
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio, ...options })
    let stdout = ''
    let stderr = ''
    child.stdout?.on('data', (chunk) => (stdout += chunk))
    child.stderr?.on('data', (chunk) => (stderr += chunk))
    child.on('error', reject)
    child.on('close', (code, signal) => resolve({ code: code ?? signal, stdout, stderr }))
    if (input !== undefined) child.stdin.end(input)
  })
}

/** True while a process with this id exists (and is not a zombie waiting for its parent). */
export function isAlive(pid) {
  try {
    process.kill(pid, 0)
  } catch (error) {
    return error.code === 'EPERM'
  }
  try {
    return !/^\d+ \(.*\) Z/s.test(readFileSync(`/proc/${pid}/stat`, 'utf8'))
  } catch {
    return true
  }
}

/**
 * What tells a process from a later one that got the same number: when it began, in the system's own count.
 * Undefined where the system does not say.
 */
export function beginningOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1).split(' ')[19]
  } catch {
    return undefined
  }
}

/** Asks a process to end, waits, and kills it when it has not ended in time. */
export async function endProcess(pid, { patience = 20_000, group = false } = {}) {
  const target = group ? -pid : pid
  if (!isAlive(pid)) return
  signal(target, 'SIGTERM')
  for (let waited = 0; waited < patience; waited += 50) {
    if (!isAlive(pid)) return
    await sleep(50)
  }
  signal(target, 'SIGKILL')
}

function signal(target, name) {
  try {
    process.kill(target, name)
  } catch (error) {
    if (error.code !== 'ESRCH') throw error
  }
}

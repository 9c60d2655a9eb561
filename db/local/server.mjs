import { spawn } from 'node:child_process'
import { existsSync, openSync, readFileSync, closeSync } from 'node:fs'
import { userInfo } from 'node:os'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { freePort, isFree } from '../../scripts/local/ports.mjs'
import { attempt, endProcess, findCommand, isAlive, run } from '../../scripts/local/processes.mjs'
import { SetUpError } from '../../scripts/local/say.mjs'
import { installDatabase } from './install.mjs'
import { socketFolder } from './socket-folder.mjs'

/**
 * Starts (and on the first call makes) a MariaDB server of this project's own, on the loopback address only. One that
 * an earlier start left running on the same data is taken over.
 * @param {object} options
 * @param {string} options.folder where its data, log and socket stand
 * @param {{ port?: number, socketFolder?: string }} options.remembered from the last start; port and folder are kept
 * @returns {Promise<{ pid: number, port: number, socketFolder: string, wasRunning: boolean, sql: (text: string) => Promise<string>, stop: () => Promise<void> }>}
 */
export async function startServer({ folder, remembered }) {
  const data = await installDatabase(folder)
  const run = socketFolder(folder, remembered.socketFolder)
  const server = { socket: join(run, 'm.sock'), pidFile: join(run, 'm.pid'), log: join(folder, 'server.log') }

  let pid = runningPid(server.pidFile)
  let port = remembered.port
  const answers = pid !== undefined && (await isUp(server.socket))
  if (answers) {
    port = Number(await sql(server.socket, 'SELECT @@port'))
  } else {
    if (pid !== undefined) await endProcess(pid)
    if (!port || !(await isFree(port))) port = await freePort()
    pid = await launch({ ...server, data, port })
  }
  return {
    pid,
    port,
    socketFolder: run,
    wasRunning: answers,
    sql: (text) => sql(server.socket, text),
    stop: () => endProcess(pid, { patience: 60_000 }),
  }
}

async function launch({ data, port, socket, pidFile, log }) {
  const output = openSync(log, 'a', 0o600)
  // In a process group of its own: a Ctrl-C at the terminal must reach the application first, and the database last.
  const child = spawn(findCommand('mariadbd'), serverArguments({ data, port, socket, pidFile }), {
    detached: true,
    stdio: ['ignore', output, output],
  })
  closeSync(output)
  let ended
  child.on('error', (error) => (ended = error.message))
  child.on('exit', (code, signal) => (ended = `it ended (${code ?? signal})`))
  child.unref()
  for (let waited = 0; waited < 60_000; waited += 100) {
    if (ended) break
    if (await isUp(socket)) return child.pid
    await sleep(100)
  }
  if (!ended) await endProcess(child.pid)
  const said = existsSync(log) ? readFileSync(log, 'utf8').trim().split('\n').slice(-15).join('\n') : ''
  throw new SetUpError(`MariaDB did not start: ${ended ?? 'no answer within a minute'}.\n${said}`)
}

function serverArguments({ data, port, socket, pidFile }) {
  return [
    '--no-defaults',
    ...(process.getuid?.() === 0 ? ['--user=root'] : []),
    `--datadir=${data}`,
    `--socket=${socket}`,
    `--pid-file=${pidFile}`,
    '--bind-address=127.0.0.1',
    `--port=${port}`,
    '--skip-name-resolve',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--default-time-zone=+00:00',
    '--innodb-buffer-pool-size=128M',
    '--innodb-log-file-size=16M',
    '--innodb-flush-log-at-trx-commit=1',
  ]
}

function runningPid(pidFile) {
  if (!existsSync(pidFile)) return undefined
  const pid = Number(readFileSync(pidFile, 'utf8').trim())
  if (!(pid > 0) || !isAlive(pid)) return undefined
  // The number may have gone to some other program since.
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(`--pid-file=${pidFile}`) ? pid : undefined
  } catch {
    return pid
  }
}

/** The server lets the system account that made it in by the socket, under its own name, as its administrator. */
function account() {
  return userInfo().username
}

async function isUp(socket) {
  if (!existsSync(socket)) return false
  const { code } = await attempt(findCommand('mariadb-admin'), [
    '--no-defaults',
    `--socket=${socket}`,
    `--user=${account()}`,
    'ping',
  ])
  return code === 0
}

async function sql(socket, text) {
  const args = [
    '--no-defaults',
    `--socket=${socket}`,
    `--user=${account()}`,
    '--batch',
    '--skip-column-names',
  ]
  return (await run(findCommand('mariadb'), args, { quiet: true, input: text })).trim()
}

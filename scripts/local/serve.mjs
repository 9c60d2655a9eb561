import { spawn } from 'node:child_process'
import { setTimeout as sleep } from 'node:timers/promises'
import { nextCommand } from './build.mjs'
import { root } from './paths.mjs'
import { endProcess } from './processes.mjs'
import { SetUpError } from './say.mjs'

/**
 * Serves the application and waits until it answers.
 * @param {object} options
 * @param {'start' | 'dev'} options.mode from a build, or from the sources with reloading
 * @param {number} options.port
 * @param {string} options.host address to listen on
 * @param {NodeJS.ProcessEnv} options.env
 * @param {'inherit' | number} options.output where its own lines go: the terminal, or an open file
 * @returns {Promise<{ pid: number, ended: Promise<number | string>, stop: () => Promise<void> }>}
 */
export async function serve({ mode, port, host, env, output }) {
  const child = spawn(process.execPath, [nextCommand, mode, '-H', host, '-p', String(port)], {
    cwd: root,
    env: { ...env, NODE_ENV: mode === 'dev' ? 'development' : 'production', NEXT_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', output, output],
    detached: true,
  })
  let over
  const ended = new Promise((resolve) => {
    child.on('error', (error) => resolve((over = error.message)))
    child.on('exit', (code, signal) => resolve((over = code ?? signal)))
  })
  const stop = () => endProcess(child.pid, { group: true, patience: 10_000 })
  const address = `http://${host.includes(':') ? `[${host}]` : host === '0.0.0.0' ? '127.0.0.1' : host}:${port}/`
  for (let waited = 0; waited < 120_000; waited += 100) {
    if (over !== undefined) throw new SetUpError(`The application ended while starting (${over}).`)
    if (await answers(address)) return { pid: child.pid, ended, stop }
    await sleep(100)
  }
  await stop()
  throw new SetUpError('The application did not answer within two minutes.')
}

async function answers(address) {
  try {
    const response = await fetch(address, { redirect: 'manual', signal: AbortSignal.timeout(60_000) })
    await response.body?.cancel()
    return true
  } catch {
    return false
  }
}

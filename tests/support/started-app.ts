import { type ChildProcess, spawn } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'

/** `npm start` as a person runs it, on a data folder of its own and the build that the tests have made. */
export interface StartedApp {
  readonly process: ChildProcess
  /** Everything it has printed so far. */
  readonly output: () => string
  /** Resolves to the exit code. */
  readonly ended: Promise<number | null>
}

/** Settings of the test run that the started application must not inherit. */
const ownSettings = [
  'DATABASE_URL',
  'SMTP_URL',
  'MAIL_PAGE_URL',
  'MAIL_FROM',
  'APP_ORIGIN',
  'NEXTAUTH_URL',
  'NEXTAUTH_SECRET',
  'FILES_ENDPOINT',
  'FILES_BUCKET',
  'FILES_REGION',
  'FILES_ACCESS_KEY',
  'FILES_SECRET_KEY',
  'PAYMENTS_ENDPOINT',
  'STRIPE_SECRET_KEY',
  'STRIPE_WEBHOOK_SECRET',
]

/** Starts it; does not wait until it serves. */
export function startApp(dataFolder: string, settings: Record<string, string>): StartedApp {
  const env = { ...process.env, CHALKFOLD_ENV: '', CHALKFOLD_DATA: dataFolder, ...settings }
  for (const name of ownSettings) if (!(name in settings)) delete (env as NodeJS.ProcessEnv)[name]
  const child = spawn(process.execPath, ['scripts/start.mjs'], { env, stdio: ['ignore', 'pipe', 'pipe'] })
  let printed = ''
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk) => (printed += chunk))
  const ended = new Promise<number | null>((resolve) => {
    child.on('close', resolve)
    // When it is killed outright, what it leaves running still holds its output open.
    child.on('exit', (code) => setTimeout(resolve, 500, code))
  })
  return { process: child, output: () => printed, ended }
}

/**
 * Waits until it says that it serves.
 * @throws {Error} with what it printed when it ends first
 */
export async function untilServing(app: StartedApp): Promise<void> {
  for (let waited = 0; waited < 180_000; waited += 50) {
    if (app.output().includes('Ctrl-C stops it')) return
    if (app.process.exitCode !== null) throw new Error(`It ended:\n${app.output()}`)
    await sleep(50)
  }
  throw new Error(`It did not come up:\n${app.output()}`)
}

/** Ids of the processes that belong to an installation: its database server and its application server. */
export function processesOf(dataFolder: string): readonly number[] {
  const settings = JSON.parse(readFileSync(join(dataFolder, 'settings.json'), 'utf8')) as {
    database: { socketFolder: string }
  }
  const ids: number[] = []
  const pidFile = join(settings.database.socketFolder, 'm.pid')
  if (existsSync(pidFile)) ids.push(Number(readFileSync(pidFile, 'utf8')))
  const running = join(dataFolder, 'running.json')
  if (existsSync(running)) ids.push((JSON.parse(readFileSync(running, 'utf8')) as { server: number }).server)
  return ids
}

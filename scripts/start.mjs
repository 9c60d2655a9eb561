/**
 * `npm start` (`npm run dev` with --dev): everything from a fresh checkout to a running workroom, and again in seconds.
 * Imports nothing but Node until the packages are installed.
 */
import { existsSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { ensureBuild } from './local/build.mjs'
import { ensureCommands } from './local/debian.mjs'
import { readEnvFile } from './local/env-file.mjs'
import { readJson, writeJson } from './local/json-file.mjs'
import { takeLock } from './local/lock.mjs'
import { ensureModules } from './local/modules.mjs'
import { dataFolder, root } from './local/paths.mjs'
import { isFree, portFrom } from './local/ports.mjs'
import { endProcess, isAlive } from './local/processes.mjs'
import { productionProblems } from './local/production.mjs'
import { runMain, say, SetUpError } from './local/say.mjs'
import { demoFile, seedDemo } from './local/seed.mjs'
import { serve } from './local/serve.mjs'
import { localDatabase, localFiles, localMail, localPayments } from './local/services.mjs'
import { halfGivenSettings } from './local/setting-groups.mjs'
import { openSettings } from './local/settings.mjs'
import { createStopping } from './local/stopping.mjs'
import { migrate } from './migrate.mjs'

const mode = process.argv.includes('--dev') ? 'dev' : 'start'
const distDir = process.env.NEXT_DIST_DIR || '.next'
const running = join(dataFolder, 'running.json')

await runMain(async () => {
  readEnvFile(join(root, '.env'))
  const production = process.env.CHALKFOLD_ENV === 'production'
  refuse('Not started in production', production ? productionProblems(process.env) : [])
  refuse('Not started', halfGivenSettings(process.env))

  const lock = takeLock(join(dataFolder, 'start.lock'))
  if (!lock.release) {
    const address = readJson(running)?.address
    throw new SetUpError(`Chalkfold runs already${address ? ` at ${address}` : ''} (process ${lock.holder}).`)
  }
  const stopping = createStopping()
  stopping.onStop(lock.release)
  try {
    const app = await bringUp(stopping, production)
    const code = await app.ended
    if (!stopping.stopping) throw new SetUpError(`The application ended by itself (${code}).`)
  } finally {
    await stopping.stop()
  }
})

function refuse(words, problems) {
  if (problems.length > 0)
    throw new SetUpError(`${words}:\n${problems.map((line) => `- ${line}`).join('\n')}`)
}

async function bringUp(stopping, production) {
  await endLeftover()
  await ensureModules()
  const folder = dataFolder
  const installation = openSettings(folder)
  const { settings } = installation
  const host = process.env.HOST || '127.0.0.1'
  const port = process.env.PORT
    ? await wantedPort(Number(process.env.PORT), host)
    : await portFrom(3000, host)
  const origin = process.env.APP_ORIGIN || `http://localhost:${port}`
  const env = {
    ...process.env,
    CHALKFOLD_ENV: process.env.CHALKFOLD_ENV || 'development',
    APP_ORIGIN: origin,
    NEXTAUTH_URL: origin,
    NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET || settings.sessionSecret,
    MAIL_FROM: process.env.MAIL_FROM || 'Chalkfold <post@chalkfold.example>',
    NEXT_DIST_DIR: distDir,
  }
  const ownDatabase = !process.env.DATABASE_URL
  if (ownDatabase) {
    await ensureCommands(['mariadbd'])
    env.DATABASE_URL = await localDatabase({
      folder,
      installation,
      stopping,
      database: { name: 'chalkfold' },
    })
  }
  const local = { folder, installation, stopping, origin }
  if (!process.env.SMTP_URL) Object.assign(env, await localMail(local))
  const [ownFiles, ownPayments] = [!process.env.FILES_ENDPOINT, !process.env.STRIPE_SECRET_KEY].map(
    (missing) => missing && !production,
  )
  if (ownFiles) Object.assign(env, await localFiles(local))
  if (ownPayments) Object.assign(env, await localPayments(local))

  const ran = await migrate(env.DATABASE_URL)
  if (ran.length > 0)
    say(`Database brought up to date (${ran.length} ${ran.length === 1 ? 'step' : 'steps'}).`)
  const signIns = ownDatabase && !production ? await demoSignIns(env, settings.demoPassword) : []
  if (mode === 'start') await ensureBuild(distDir, env)

  const app = await serve({ mode, port, host, env, output: 'inherit' })
  stopping.onStop(() => rmSync(running, { force: true }))
  stopping.onStop(app.stop)
  writeJson(running, { address: origin, server: app.pid })
  const pages = {
    Mailbox: [env.MAIL_PAGE_URL, 'mail it sends, kept on this machine'],
    Files: [ownFiles && env.FILES_ENDPOINT, 'what it stores, kept on this machine'],
    Payments: [ownPayments && env.PAYMENTS_ENDPOINT, 'cards for practice, no money moves'],
  }
  announce({ origin, pages, signIns, password: settings.demoPassword })
  return app
}

/** A start that was killed outright could not stop its server, which would still hold the port. */
async function endLeftover() {
  const pid = readJson(running)?.server
  if (!pid || !isAlive(pid)) return
  const command = existsSync(`/proc/${pid}/cmdline`) ? readFileSync(`/proc/${pid}/cmdline`, 'utf8') : ''
  if (command.includes(join(root, 'node_modules', 'next')) || command.startsWith('next-server')) {
    await endProcess(pid, { group: true })
  }
}

async function wantedPort(port, host) {
  if (!Number.isInteger(port) || port < 1 || port > 65535)
    throw new SetUpError(`PORT is a number from 1 to 65535, such as 3000.`)
  if (!(await isFree(port, host)))
    throw new SetUpError(`Port ${port} is taken: end what uses it, or set PORT to another.`)
  return port
}

/** Made once for each database; the list is kept beside it, so that it goes when the database goes. */
async function demoSignIns(env, password) {
  const kept = demoFile(dataFolder)
  const known = readJson(kept)
  if (known) return known
  say('Making the demo workroom …')
  const signIns = await seedDemo({ ...env, DEMO_PASSWORD: password })
  if (signIns.length > 0) writeJson(kept, signIns)
  return signIns
}

function announce({ origin, pages, signIns, password }) {
  say(`\n  Chalkfold     ${origin}`)
  for (const [name, [address, words]] of Object.entries(pages))
    if (address) say(`  ${name.padEnd(13)} ${address}  (${words})`)
  if (signIns.length > 0) {
    say(`\n  Demo sign-ins, all with the password  ${password}`)
    for (const { name, email, roles } of signIns)
      say(`    ${email.padEnd(32)} ${name}, ${roles.join(' and ')}`)
  }
  say('\n  Ctrl-C stops it; the data stays.\n')
}

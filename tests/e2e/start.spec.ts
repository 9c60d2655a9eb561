import { mkdirSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, test } from '@playwright/test'
import { isAlive } from '../../scripts/local/processes.mjs'
import { freePort } from '../../scripts/local/ports.mjs'
import { processesOf, startApp, type StartedApp, untilServing } from '../support/started-app'

test.describe.configure({ mode: 'serial' })
test.setTimeout(90_000)

/** Deep enough that the database's socket has to move to a short path. */
const top = mkdtempSync(join(tmpdir(), 'chalkfold-start-'))
const data = join(top, 'a-folder-with-a-long-name'.repeat(3), 'and-another-one'.repeat(3))
let port: string
let app: StartedApp

test.beforeAll(async () => {
  mkdirSync(data, { recursive: true })
  port = String(await freePort())
})

test.afterAll(async () => {
  if (app?.process.kill('SIGINT')) await app.ended
  rmSync(top, { recursive: true, force: true })
})

async function start(): Promise<StartedApp> {
  app = startApp(data, { PORT: port })
  await untilServing(app)
  return app
}

test('a first start makes everything and says where it is', async ({ request }) => {
  await start()
  expect(app.output()).toContain(`http://localhost:${port}`)
  const password = /all with the password {2}(\S+)/.exec(app.output())?.[1]
  expect(password).toMatch(/^[a-z]+-[a-z]+-\d{6}$/)
  expect((await request.get(`http://localhost:${port}/`)).status()).toBeLessThan(400)
  const mailbox = /Mailbox\s+(\S+)/.exec(app.output())?.[1] ?? ''
  expect(await (await request.get(mailbox)).text()).toContain('Local mailbox')
  for (const [name, title] of [
    ['Files', 'Local files'],
    ['Payments', 'Local payments'],
  ] as const) {
    const page = new RegExp(`${name}\\s+(\\S+)`).exec(app.output())?.[1] ?? ''
    expect(await (await request.get(page)).text()).toContain(title)
  }
})

test('a second start beside it is refused and says where it runs', async () => {
  const second = startApp(data, {})
  expect(await second.ended).toBe(1)
  expect(second.output()).toContain(`Chalkfold runs already at http://localhost:${port}`)
})

test('Ctrl-C stops the application and the database', async () => {
  const processes = processesOf(data)
  expect(processes).toHaveLength(2)
  expect(processes.every(isAlive)).toBe(true)
  app.process.kill('SIGINT')
  expect(await app.ended).toBe(0)
  expect(processes.some(isAlive)).toBe(false)
})

test('the next start keeps secrets, sign-ins and data, and comes up in seconds', async () => {
  const settings = readFileSync(join(data, 'settings.json'), 'utf8')
  const before = Date.now()
  await start()
  expect(Date.now() - before).toBeLessThan(20_000)
  expect(JSON.parse(readFileSync(join(data, 'settings.json'), 'utf8'))).toMatchObject(JSON.parse(settings))
  expect(app.output()).toMatch(/all with the password/)
  expect(app.output()).not.toContain('Making the demo')
})

test('after it was killed outright the next start takes over what was left running', async ({ request }) => {
  app.process.kill('SIGKILL')
  await app.ended
  await start()
  expect((await request.get(`http://localhost:${port}/`)).status()).toBeLessThan(400)
  const processes = processesOf(data)
  app.process.kill('SIGINT')
  expect(await app.ended).toBe(0)
  expect(processes.some(isAlive)).toBe(false)
})

test('half of a group of settings is refused, whatever the other services are', async () => {
  const refused = startApp(data, { STRIPE_SECRET_KEY: 'sk_live_of_nobody' })
  expect(await refused.ended).toBe(1)
  expect(refused.output()).toContain('STRIPE_WEBHOOK_SECRET is missing, while STRIPE_SECRET_KEY is given')
})

test('production refuses to start without real settings, and names each', async () => {
  const refused = startApp(data, { CHALKFOLD_ENV: 'production', NEXTAUTH_SECRET: 'change-me' })
  expect(await refused.ended).toBe(1)
  for (const name of ['DATABASE_URL', 'SMTP_URL', 'MAIL_FROM', 'APP_ORIGIN']) {
    expect(refused.output()).toContain(`${name} is missing`)
  }
  expect(refused.output()).toContain('NEXTAUTH_SECRET can be guessed')
})

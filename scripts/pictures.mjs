/**
 * `npm run pictures`: the screenshots of the README, taken from the demo workroom: laptop and phone, light and dark,
 * into scripts/pictures.
 */
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { findCommand } from './local/processes.mjs'
import { ensureModules } from './local/modules.mjs'
import { root } from './local/paths.mjs'
import { runMain, say } from './local/say.mjs'
import { createStopping } from './local/stopping.mjs'
import { takeSlot } from './testing/slot.mjs'
import { bringUpApp } from './testing/test-app.mjs'
import { bringUpDatabase } from './testing/test-database.mjs'

const folder = join(root, 'scripts', 'pictures')
const devices = {
  laptop: { viewport: { width: 1440, height: 900 } },
  phone: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 },
}

await runMain(async () => {
  const stopping = createStopping()
  const slot = takeSlot()
  stopping.onStop(slot.release)
  try {
    await ensureModules()
    const env = await bringUpDatabase({ folder: slot.folder, stopping, keep: false })
    const [owner] = await bringUpApp({ folder: slot.folder, env, stopping })
    const { chromium } = await import('playwright')
    const browser = await chromium.launch({
      executablePath: findCommand('chromium'),
      args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu'],
    })
    stopping.onStop(() => browser.close())
    mkdirSync(folder, { recursive: true })
    for (const [device, options] of Object.entries(devices)) {
      for (const theme of ['light', 'dark']) {
        const context = await browser.newContext({ ...options, colorScheme: theme, baseURL: env.APP_ORIGIN })
        await takeAll(context, { email: owner.email, password: env.DEMO_PASSWORD }, `${device}-${theme}`)
        await context.close()
      }
    }
  } finally {
    await stopping.stop()
  }
})

async function takeAll(context, { email, password }, suffix) {
  const page = await context.newPage()
  await page.goto('/')
  await keep(page, `welcome-${suffix}`)

  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL('**/clients')
  await keep(page, `clients-${suffix}`)

  await openFirst(page, '/clients', /^\/clients\/[0-9a-f-]{36}$/)
  await openFirst(page, undefined, /^\/cards\/[0-9a-f-]{36}$/)
  await keep(page, `measure-card-${suffix}`)

  await openFirst(page, '/drafts?search=dress', /^\/drafts\/[0-9a-f-]{36}$/)
  await page.locator('svg').first().waitFor()
  await keep(page, `studio-${suffix}`)
}

/** Follows the first link of a page whose address has this shape. */
async function openFirst(page, path, shape) {
  if (path) await page.goto(path)
  await page.locator('main a').first().waitFor()
  const addresses = await page
    .locator('main a')
    .evaluateAll((links) => links.map((link) => link.getAttribute('href')))
  const address = addresses.find((each) => shape.test(each ?? ''))
  if (!address) throw new Error(`${page.url()} links to nothing like ${shape}`)
  await page.goto(address)
}

async function keep(page, name) {
  await page.waitForLoadState('networkidle')
  await page.evaluate(() => document.fonts.ready)
  await page.screenshot({ path: join(folder, `${name}.png`), animations: 'disabled' })
  say(`scripts/pictures/${name}.png`)
}

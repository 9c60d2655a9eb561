import { readFileSync } from 'node:fs'
import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Browser, type Locator, type Page } from '@playwright/test'
import { PDFDocument } from 'pdf-lib'
import { body, changeAndSave, measureClient, signInToDemo, startDress } from './support/demo'

/** A name that nothing else on any page contains. */
const client = 'Zephyrine Quillfeather'

async function shareLink(page: Page, scope: 'Drawing' | 'Lesson'): Promise<string> {
  await page.getByRole('button', { name: 'Share', exact: true }).click()
  const dialog = page.getByRole('dialog', { name: 'Share by link' })
  await dialog.getByRole('radio', { name: scope }).check()
  if (scope === 'Lesson') {
    await expect(dialog.getByRole('button', { name: 'Make the link' })).toBeDisabled()
    await dialog.getByRole('checkbox', { name: /agrees/ }).check()
  }
  await dialog.getByRole('button', { name: 'Make the link' }).click()
  const link = await dialog.getByLabel('The link').inputValue()
  await expect(dialog.getByText('Works until').first()).toBeVisible()
  await dialog.getByRole('button', { name: 'Close' }).click()
  return link
}

/** Somebody who was only sent the link, and everything the server sends them, page scripts apart. */
async function visitorOf(browser: Browser, link: string) {
  const context = await browser.newContext({ timezoneId: 'Asia/Kolkata' })
  const page = await context.newPage()
  const sent: string[] = []
  page.on('response', async (response) => {
    if (response.url().includes('/_next/static/')) return
    sent.push(`${JSON.stringify(response.headers())} ${await response.text().catch(() => '')}`)
  })
  const first = await page.goto(link)
  return { page, sent, first, close: () => context.close() }
}

/** Comes back to the window until something is seen there: a page that was asked a moment ago does not ask again. */
async function comeBack(page: Page, seen: Locator) {
  await expect(async () => {
    await page.evaluate(() => window.dispatchEvent(new Event('focus')))
    await expect(seen).toBeVisible({ timeout: 1000 })
  }).toPass({ timeout: 15_000 })
}

async function expectNoBarriers(page: Page) {
  for (const theme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme: theme, reducedMotion: 'reduce' })
    const { violations } = await new AxeBuilder({ page }).analyze()
    expect(violations.map(({ id, nodes }) => `${theme}: ${id}: ${nodes[0]?.html}`)).toEqual([])
  }
}

async function downloaded(page: Page, name: string) {
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name }).click()
  const download = await waiting
  return { name: download.suggestedFilename(), bytes: readFileSync(await download.path()) }
}

test('a shared drawing: seen, switched, printed, refreshed, taken back, and nothing of the client in it', async ({
  page,
  browser,
}) => {
  test.setTimeout(180_000)
  await signInToDemo(page)
  await measureClient(page, client, body)
  await startDress(page, 'Blue dress')
  const link = await shareLink(page, 'Drawing')
  const visitor = await visitorOf(browser, link)

  await test.step('the drawing stands in the first answer, kept by no cache and told to no other page', async () => {
    expect(visitor.first?.status()).toBe(200)
    const html = (await visitor.first?.text()) ?? ''
    expect(html).toMatch(/<svg[^>]*viewBox.*<path/)
    expect(visitor.first?.headers()['referrer-policy']).toBe('no-referrer')
    expect(visitor.first?.headers()['cache-control']).toContain('no-store')
    await expect(visitor.page.locator('meta[name=robots]')).toHaveAttribute('content', /noindex/)
    await expect(visitor.page.getByRole('heading', { level: 1 })).toHaveText('Blue dress')
  })

  await test.step('says when it was saved by the visitor’s own clock', async () => {
    const saved = await visitor.page.locator('time').getAttribute('datetime')
    const there = new Date(saved ?? '').toLocaleTimeString('en-GB', {
      timeStyle: 'short',
      timeZone: 'Asia/Kolkata',
    })
    await expect(visitor.page.getByText(/^Flared dress, drafted by/)).toContainText(`at ${there}.`)
  })

  await test.step('its scripts weigh little beside the framework’s', async () => {
    const weight = await visitor.page.evaluate(() =>
      performance
        .getEntriesByType('resource')
        .filter((entry) => entry.name.includes('.js'))
        .reduce((sum, entry) => sum + (entry as PerformanceResourceTiming).encodedBodySize, 0),
    )
    test
      .info()
      .annotations.push({ type: 'scripts of a shared page, bytes gzipped', description: String(weight) })
    // About 130 kB are the framework's own.
    expect(weight).toBeLessThan(170_000)
  })

  await test.step('every length follows the unit', async () => {
    const drawn = (unit: string) => visitor.page.locator(`svg g[data-unit=${unit}] text`).first()
    await expect(
      visitor.page.getByText('41 3⁄8 in').or(visitor.page.getByText('41\u20093⁄8 in')).first(),
    ).toBeVisible()
    await expect(drawn('in')).toBeVisible()
    await expect(drawn('cm')).toBeHidden()
    await visitor.page.getByRole('button', { name: 'cm', exact: true }).click()
    await expect(visitor.page.getByText('105 cm').last()).toBeVisible()
    await expect(drawn('in')).toBeHidden()
    await expect(drawn('cm')).toBeVisible()
  })

  await test.step('A4, letter and one piece are downloaded under a plain name', async () => {
    const a4 = await downloaded(visitor.page, 'Download the sheets (PDF)')
    expect(a4.name).toBe('Blue dress A4 with allowances.pdf')
    const pages = (await PDFDocument.load(a4.bytes)).getPages()
    expect(pages.length).toBeGreaterThan(15)
    await visitor.page.getByLabel('Paper', { exact: true }).selectOption('letter')
    const letter = await PDFDocument.load((await downloaded(visitor.page, 'Download the sheets (PDF)')).bytes)
    expect([letter.getPage(0).getWidth(), letter.getPage(0).getHeight()].map(Math.round)).toEqual([612, 792])
    const svg = await downloaded(visitor.page, 'Download in one piece (SVG)')
    expect(svg.bytes.toString('utf8')).toMatch(/^<svg[^>]*width="[\d.]+mm"/)
    for (const file of [a4.bytes, svg.bytes]) expect(file.toString('latin1')).not.toContain('Quillfeather')
  })

  await test.step('no barriers in either theme', () => expectNoBarriers(visitor.page))

  await test.step('the tutor’s latest comes when the window comes back', async () => {
    const depth = page.getByRole('textbox', { name: 'Neck depth, in', exact: true })
    await changeAndSave(page, async () => {
      await depth.fill('5 1/4')
      await depth.press('Enter')
    })
    await comeBack(visitor.page, visitor.page.getByText('13.3 cm').last())
  })

  await test.step('nothing the server sent names the client or holds a measurement, an order or a sum', () => {
    expect(visitor.sent.length).toBeGreaterThan(1)
    const everything = visitor.sent.join('\n')
    const secrets = [
      'Quillfeather',
      'Zephyrine',
      '927.1',
      '996.95',
      '36 1⁄2',
      '39 1⁄4',
      '÷',
      'measurements"',
      '"bust',
      '"order',
    ]
    // Within a page's own data every quotation mark is escaped.
    const held = (secret: string) =>
      everything.includes(secret) || everything.includes(secret.replace('"', '\\"'))
    expect(secrets.filter(held)).toEqual([])
  })

  await test.step('taken back, it shows nothing: in the open page, and with 404 in a fresh one', async () => {
    await page.getByRole('button', { name: 'Share', exact: true }).click()
    await page.getByRole('button', { name: /^Take back/ }).click()
    await expect(page.getByText('It was taken back')).toBeVisible()
    await comeBack(visitor.page, visitor.page.getByText('This link shows nothing now'))
    expect((await visitor.page.goto(link))?.status()).toBe(404)
    await expect(visitor.page.getByText('This link shows nothing now')).toBeVisible()
    expect(
      (await visitor.page.request.get(link.replace('/s/', '/api/shared/') + '/pattern.pdf')).status(),
    ).toBe(404)
    await expectNoBarriers(visitor.page)
  })
  await visitor.close()
})

test('a lesson shows the sums, after a warning, and still not the client', async ({ page, browser }) => {
  test.setTimeout(120_000)
  await signInToDemo(page)
  await measureClient(page, client, body)
  await startDress(page, 'Lesson dress')
  const visitor = await visitorOf(browser, await shareLink(page, 'Lesson'))
  await expect(visitor.page.getByRole('heading', { name: 'Step by step' })).toBeVisible()
  await expect(visitor.page.getByText(/36.1⁄2 ÷ 6 \+ 1.1⁄2 ≈ 7.5⁄8/).first()).toBeVisible()
  await expectNoBarriers(visitor.page)
  expect(visitor.sent.join('\n')).not.toContain('Quillfeather')
  await visitor.close()
})

test('the print and share dialogs have no barriers, and the preview follows the choices', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signInToDemo(page)
  await measureClient(page, client, body)
  await startDress(page, 'Printed dress')
  await page.getByRole('button', { name: 'Print', exact: true }).click()
  const dialog = page.getByRole('dialog', { name: 'Print the pattern' })
  const facts = dialog.getByText(/sheets of .* and a first one with the test squares/)
  await expect(facts).toContainText('sheets of A4')
  await dialog.getByLabel('Paper', { exact: true }).selectOption('a3')
  await expect(facts).toContainText('sheets of A3')
  await dialog.getByLabel('Way of the paper').selectOption('landscape')
  await expect(facts).toContainText('on its side')
  await expectNoBarriers(page)
  const pdf = await downloaded(page, 'Download the sheets (PDF)')
  expect(pdf.name).toBe('Printed dress A3 with allowances.pdf')
  await dialog.getByRole('button', { name: 'Close' }).click()
  await page.getByRole('button', { name: 'Share', exact: true }).click()
  await expect(page.getByRole('dialog', { name: 'Share by link' })).toBeVisible()
  await expectNoBarriers(page)
})

test('the door: a number changes the dress and its sums, and no barriers', async ({ page }) => {
  await page.goto('/')
  const shape = () => page.locator('svg path[data-id="front/cut/0"]').getAttribute('d')
  const before = await shape()
  const bust = page.getByLabel('Bust, in inches')
  await bust.fill('40')
  await expect(page.getByText('40 ÷ 6 + 1\u20091⁄2 ≈ 8\u20091⁄8 in')).toBeVisible()
  expect(await shape()).not.toBe(before)
  await bust.fill('40 1/0')
  await expect(bust).toHaveAttribute('aria-invalid', 'true')
  await expectNoBarriers(page)
  await page.goto('/legal')
  await expectNoBarriers(page)
})

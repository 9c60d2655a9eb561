import { readFileSync } from 'node:fs'
import { expect, test, type Page } from '@playwright/test'
import { PDFDocument } from 'pdf-lib'
import { findSquares } from '../print/support/find-squares'
import { rendered, words } from '../print/support/rendered'
import { onTable, tape } from '../print/support/taped'
import { expectAccessible } from './support/axe'
import { body, changeAndSave, measureClient, startDress } from './support/demo'
import { joinAs } from './support/people'

const neckDepth = (page: Page) => page.getByRole('textbox', { name: 'Neck depth, in', exact: true })

const frontShape = (page: Page) =>
  page
    .locator('[data-sheet] path[data-piece="front"]')
    .evaluateAll((paths) => paths.map((path) => path.getAttribute('d')).join())

/** Pulls the point of the front neckline down by so many pixels. */
async function pullNeckDown(page: Page, by: number): Promise<void> {
  const box = await page.getByRole('button', { name: 'Point for Front neck lower by' }).boundingBox()
  if (!box) throw new Error('The point is not on the sheet.')
  const middle = { x: box.x + box.width / 2, y: box.y + box.height / 2 }
  await page.mouse.move(middle.x, middle.y)
  await page.mouse.down()
  await page.mouse.move(middle.x, middle.y + by, { steps: 8 })
  await page.mouse.up()
}

async function saveAs(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: 'Versions' }).click()
  await page.getByLabel('Name this version').fill(name)
  await page.getByRole('button', { name: 'Save it' }).click()
  await expect(page.getByRole('listitem').filter({ hasText: name })).toContainText('On the table')
  await expectAccessible(page)
  await page.getByRole('button', { name: 'Close', exact: true }).click()
}

async function shareDrawing(page: Page): Promise<string> {
  await page.getByRole('button', { name: 'Share', exact: true }).click()
  const dialog = page.getByRole('dialog', { name: 'Share by link' })
  await dialog.getByRole('radio', { name: 'Drawing' }).check()
  await dialog.getByRole('button', { name: 'Make the link' }).click()
  const link = await dialog.getByLabel('The link').inputValue()
  await expectAccessible(page)
  await dialog.getByRole('button', { name: 'Close' }).click()
  return link
}

/** The sheets for a paper, as the visitor's browser receives them. */
async function sheetsFor(page: Page, paper: 'a4' | 'letter'): Promise<Uint8Array> {
  await page.getByLabel('Paper', { exact: true }).selectOption(paper)
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name: 'Download the sheets (PDF)' }).click()
  return readFileSync(await (await waiting).path())
}

/** Measures the sheets in their picture: page size, both test squares, and how well the pages tape together. */
async function expectTrueScale(pdf: Uint8Array, paper: { readonly width: number; readonly height: number }) {
  const [cover] = (await PDFDocument.load(pdf)).getPages()
  const sides = [cover?.getWidth() ?? 0, cover?.getHeight() ?? 0].map((points) => (points * 25.4) / 72)
  expect(Math.abs(Math.min(...sides) - paper.width)).toBeLessThan(0.1)
  expect(Math.abs(Math.max(...sides) - paper.height)).toBeLessThan(0.1)

  const pictures = rendered(pdf)
  const [first] = pictures
  if (!first) throw new Error('The file has no page.')
  for (const side of [100, 101.6]) {
    const found = findSquares(first, side).map(({ left, right, top, bottom }) => [right - left, bottom - top])
    const isTrue = ([width = 0, height = 0]: number[]) =>
      Math.abs(width - side) < 0.1 && Math.abs(height - side) < 0.1
    expect(found.filter(isTrue), `squares of ${side} mm among ${JSON.stringify(found)}`).toHaveLength(1)
  }

  const taped = tape(pictures.slice(1), words(pdf).slice(1), { turn: 0, x: 0, y: 0 })
  expect(taped).toHaveLength(pictures.length - 1)
  const places = new Map<string, { x: number; y: number }[]>()
  for (const { marks, laid } of taped) {
    for (const mark of marks) places.set(mark.name, [...(places.get(mark.name) ?? []), onTable(laid, mark)])
  }
  const meeting = [...places.values()].filter((spots) => spots.length > 1)
  expect(meeting.length).toBeGreaterThan(10)
  for (const [one, ...others] of meeting) {
    for (const other of others) {
      expect(Math.hypot(other.x - (one?.x ?? 0), other.y - (one?.y ?? 0))).toBeLessThan(0.3)
    }
  }
}

test('join, measure, draft, change, save, share, and print sheets that measure true', async ({
  page,
  browser,
}) => {
  test.setTimeout(300_000)
  await test.step('a new user opens a workroom', async () => {
    await page.goto('/')
    await expectAccessible(page)
    await joinAs(page, { name: 'Nora Fielding', workroom: 'Fielding and daughter' })
    await expectAccessible(page)
  })

  await test.step('measures a client in inches with fractions, and starts a dress', async () => {
    await measureClient(page, 'Ottilie Brandt', body)
    await expect(page.getByLabel('Bust', { exact: true })).toHaveValue(/^36 1[⁄/]2$/)
    await expectAccessible(page)
    await startDress(page, 'Summer dress')
    await expectAccessible(page)
  })

  await test.step('changes the neck depth by typing and by dragging', async () => {
    const before = await frontShape(page)
    await neckDepth(page).fill('4 1/2')
    await neckDepth(page).press('Enter')
    await expect.poll(() => frontShape(page)).not.toBe(before)
    const typed = await frontShape(page)
    await changeAndSave(page, () => pullNeckDown(page, 16))
    await expect.poll(() => frontShape(page)).not.toBe(typed)
    await expect(neckDepth(page)).not.toHaveValue(/^4 1[⁄/]2$/)
  })

  await saveAs(page, 'For the first fitting')
  const link = await shareDrawing(page)
  const depth = await neckDepth(page).inputValue()

  const privately = await browser.newContext()
  const visitor = await privately.newPage()
  await test.step('a visitor opens the link in a private window', async () => {
    await visitor.goto(link)
    await expect(visitor.getByRole('heading', { level: 1 })).toHaveText('Summer dress')
    await expect(visitor.getByText(depth.replace(' ', '\u2009')).first()).toBeVisible()
    await expect(visitor.getByText('Brandt')).toHaveCount(0)
    await expectAccessible(visitor)
  })

  await test.step('prints A4 sheets that measure true', async () => {
    await expectTrueScale(await sheetsFor(visitor, 'a4'), { width: 210, height: 297 })
  })
  await test.step('prints letter sheets that measure true', async () => {
    await expectTrueScale(await sheetsFor(visitor, 'letter'), { width: 215.9, height: 279.4 })
  })
  await privately.close()
})

import { expect, test, type Page } from '@playwright/test'
import { expectAccessible } from './support/axe'
import { body, changeAndSave, measureClient, signInToDemo, startDress } from './support/demo'

const neckDepth = (page: Page) => page.getByRole('textbox', { name: 'Neck depth, in', exact: true })
const saved = (page: Page) => page.getByRole('banner').getByRole('status')

/** The shape of the front on the sheet. */
const frontShape = (page: Page) =>
  page
    .locator('[data-sheet] path[data-piece="front"]')
    .evaluateAll((paths) => paths.map((path) => path.getAttribute('d')))

/** The newest saved version of the draft that is open. */
async function savedVersion(page: Page) {
  const id = page.url().split('/').at(-1) ?? ''
  const list = await (await page.request.get(`/api/drafts/${id}/revisions`)).json()
  const newest = await page.request.get(`/api/drafts/${id}/revisions/${list.value[0].id}`)
  const { order, typed } = (await newest.json()).value
  return { versions: list.value.length as number, order, typed }
}

test.beforeEach(async ({ page }) => {
  await signInToDemo(page)
})

test('a card keeps inches with their fractions, and centimetres do not move them', async ({ page }) => {
  await measureClient(page, 'Card Test', body)
  await page.reload()
  const bust = page.getByLabel('Bust', { exact: true })
  await expect(bust).toHaveValue('36 1⁄2')
  for (let turn = 0; turn < 20; turn += 1) {
    await page.getByRole('button', { name: 'cm', exact: true }).click()
    await page.getByRole('button', { name: 'inches' }).click()
  }
  await expect(bust).toHaveValue('36 1⁄2')
  await page.getByRole('button', { name: 'cm', exact: true }).click()
  await expect(bust).toHaveValue('92.7')
})

test('a card says at the field what it cannot read and what is odd', async ({ page }) => {
  await measureClient(page, 'Odd Test', body)
  await page.getByLabel('Waist', { exact: true }).fill('29 1/0')
  await expect(page.getByLabel('Waist', { exact: true })).toHaveAttribute('aria-invalid', 'true')
  await expect(page.getByText('cannot have 0 below the line')).toBeVisible()
  await page.getByLabel('Waist', { exact: true }).fill('60')
  await expect(page.getByText(/Waist 60.in is large/)).toBeVisible()
  await expectAccessible(page)
})

test('neck depth: typed, dragged, undone to the bytes, and kept', async ({ page }) => {
  await measureClient(page, 'Neck Test', body)
  await startDress(page, 'Neck dress')
  const before = await frontShape(page)
  const start = await savedVersion(page)

  await neckDepth(page).fill('4 1/2')
  await expect.poll(() => frontShape(page)).not.toEqual(before)
  await page.keyboard.press('Enter')
  await expect(page.locator('p[aria-live]')).toContainText(/Neck depth 4½ inches; front neckline/)
  await expect(saved(page)).toHaveText('Saved')
  const typed = await frontShape(page)

  const point = page.getByRole('button', { name: 'Point for Front neck lower by' })
  const box = await point.boundingBox()
  if (!box) throw new Error('The point is not on the sheet.')
  const middle = { x: box.x + box.width / 2, y: box.y + box.height / 2 }
  await page.mouse.move(middle.x, middle.y)
  await page.mouse.down()
  await page.mouse.move(middle.x, middle.y + 20, { steps: 6 })
  await expect.poll(() => frontShape(page)).not.toEqual(typed)
  await expect(page.getByText(/Front neck lower by .*in/)).toBeVisible()
  await page.keyboard.press('Escape')
  await expect.poll(() => frontShape(page)).toEqual(typed)
  await page.mouse.up()

  await page.mouse.move(middle.x, middle.y)
  await page.mouse.down()
  await page.mouse.move(middle.x, middle.y + 20, { steps: 6 })
  await page.mouse.up()
  await expect.poll(() => frontShape(page)).not.toEqual(typed)

  await page.getByRole('button', { name: 'Undo' }).click()
  await expect.poll(() => frontShape(page)).toEqual(typed)
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect.poll(() => frontShape(page)).toEqual(before)
  await expect(page.getByRole('button', { name: 'Undo' })).toBeDisabled()
  await expect(saved(page)).toHaveText('Saved')
  await expect.poll(async () => (await savedVersion(page)).order).toEqual(start.order)
  expect((await savedVersion(page)).typed).toEqual(start.typed)
})

test('what cannot be drafted stays at its tag with the reason, over the last good drawing', async ({
  page,
}) => {
  await measureClient(page, 'Reason Test', body)
  await startDress(page, 'Reason dress')
  const before = await frontShape(page)
  await neckDepth(page).fill('40')
  await expect(page.getByRole('textbox', { name: 'Neck depth, in', exact: true })).toHaveAttribute(
    'aria-invalid',
    'true',
  )
  await expect(page.getByRole('button', { name: 'Put back' }).first()).toBeVisible()
  expect(await frontShape(page)).toEqual(before)
  await page.keyboard.press('Escape')
  await expect(neckDepth(page)).not.toHaveAttribute('aria-invalid', 'true')
})

test('everything works from the keyboard alone', async ({ page }) => {
  await measureClient(page, 'Keys Test', body)
  await startDress(page, 'Keys dress')
  await page.keyboard.press('n')
  await expect(page.getByRole('textbox', { name: 'Neck wider by, in' }).first()).toBeFocused()
  await page.keyboard.type('1/2')
  await page.keyboard.press('Tab')
  await expect(page.locator('p[aria-live]')).toContainText('Neck wider by ½ inch')
  await expect(neckDepth(page)).toBeFocused()
  await page.keyboard.press('ArrowUp')
  await page.keyboard.press('Enter')
  await expect(page.locator('p[aria-live]')).toContainText('Neck depth 3⅛ inches')
  await page.getByRole('button', { name: 'Point for Length from the shoulder' }).first().focus()
  await page.keyboard.press('Shift+ArrowDown')
  await expect(page.locator('p[aria-live]')).toContainText(/Length/)
  for (let undone = 0; undone < 3; undone += 1) await page.keyboard.press('Control+z')
  await expect(page.getByRole('textbox', { name: 'Neck wider by, in' }).first()).toHaveValue('0')
  const ribbon = page.getByRole('slider', { name: 'Steps of the draft' })
  await ribbon.focus()
  await page.keyboard.press('Home')
  await expect(ribbon).toHaveAttribute('aria-valuetext', /^1 of \d+\./)
  await page.keyboard.press('End')
  await expect(ribbon).toHaveAttribute('aria-valuetext', /Finished pattern/)
})

test('a point that cannot be dragged says why, and what does move it', async ({ page }) => {
  await measureClient(page, 'Fixed Test', body)
  await startDress(page, 'Fixed dress')
  // The same words stand in the list of points, for those who hear them.
  const words = page.locator('[data-sheet] div[aria-hidden]').getByText('move it.')
  const point = page.getByRole('button', { name: /^Point C of Front\. / })
  await point.focus()
  await expect(point).toHaveAccessibleName(
    /cannot be dragged: it follows from the body\. Across shoulders.* move it\.$/,
  )
  await expect(words).toBeVisible()
  await page.keyboard.press('ArrowRight')
  await expect(page.getByRole('button', { name: /^Point G of Front\. / })).toBeFocused()

  await point.focus()
  const dot = await page.locator('[data-sheet] .rotate-45').boundingBox()
  await page.keyboard.press('Tab')
  await expect(words).toBeHidden()
  await page.mouse.move((dot?.x ?? 0) + (dot?.width ?? 0) / 2, (dot?.y ?? 0) + (dot?.height ?? 0) / 2)
  await expect(words).toBeVisible()
  await page.mouse.move(2, 2)
  await expect(words).toBeHidden()
})

test('choices are folded by part, drawn, and what does not apply is not asked', async ({ page }) => {
  await measureClient(page, 'Choice Test', body)
  await startDress(page, 'Choice dress')
  const drawer = page.getByRole('complementary', { name: 'Drawer' })
  await drawer.locator('label', { hasText: 'Square' }).click()
  await expect(drawer.getByRole('radio', { name: 'Square' })).toBeChecked()
  const sleeve = drawer.getByRole('button', { name: /^Sleeve/ })
  await expect(sleeve).toHaveAttribute('aria-expanded', 'false')
  await expect(sleeve).toContainText('Plain')
  await sleeve.click()
  await expect(drawer.getByLabel('Sleeve length')).toBeVisible()
  await expect(page.locator('[data-sheet] [data-piece=sleeve]').first()).toBeAttached()
  await drawer
    .locator('label', { hasText: /^None$/ })
    .first()
    .click()
  await expect(drawer.getByLabel('Sleeve length')).toHaveCount(0)
  await expect(page.locator('[data-sheet] [data-piece=sleeve]')).toHaveCount(0)
})

test('zooming keeps the place under the pointer; the wheel pans', async ({ page }) => {
  await measureClient(page, 'View Test', body)
  await startDress(page, 'View dress')
  const hem = page.getByRole('button', { name: 'Point for Flare, share of a circle and Length' }).first()
  const before = await hem.boundingBox()
  if (!before) throw new Error('The point is not on the sheet.')
  await page.mouse.move(before.x + before.width / 2, before.y + before.height / 2)
  await page.keyboard.down('Control')
  await page.mouse.wheel(0, -200)
  await page.keyboard.up('Control')
  const zoomed = await hem.boundingBox()
  expect(Math.abs((zoomed?.x ?? 0) - before.x)).toBeLessThan(1)
  expect(Math.abs((zoomed?.y ?? 0) - before.y)).toBeLessThan(1)
  await page.mouse.wheel(30, 40)
  await expect.poll(async () => Math.round(((await hem.boundingBox())?.y ?? 0) - (zoomed?.y ?? 0))).toBe(-40)
})

test('two tabs on one draft: both versions are kept, and the person chooses', async ({ page, context }) => {
  await measureClient(page, 'Tabs Test', body)
  const address = await startDress(page, 'Tabs dress')
  const other = await context.newPage()
  await other.goto(address)
  await expect(neckDepth(other)).toBeVisible()

  await changeAndSave(page, async () => {
    await neckDepth(page).fill('4')
    await page.keyboard.press('Enter')
  })
  await neckDepth(other).fill('5')
  await other.keyboard.press('Enter')
  await expect(saved(other)).toHaveText(/Two versions/)
  await expect(other.getByRole('alert').filter({ hasText: 'changed elsewhere' })).toContainText(
    'Both versions are kept',
  )
  await other.getByRole('button', { name: 'The one on this table' }).click()
  await expect(saved(other)).toHaveText('Saved')
  await other.getByRole('button', { name: 'Versions' }).click()
  await expect(other.getByText('Kept beside another version')).toBeVisible()
  await other.keyboard.press('Escape')
  await other.reload()
  await expect(neckDepth(other)).toHaveValue('5')
})

test('an edit made without network survives the closed tab', async ({ page, context }) => {
  await measureClient(page, 'Offline Test', body)
  const address = await startDress(page, 'Offline dress')
  await context.setOffline(true)
  await neckDepth(page).fill('4 3/4')
  await page.keyboard.press('Enter')
  await expect(saved(page)).toHaveText('Offline: kept on this device')
  await page.close()
  await context.setOffline(false)
  const again = await context.newPage()
  await again.goto(address)
  await expect(neckDepth(again)).toHaveValue('4 3⁄4')
  await expect(saved(again)).toHaveText('Saved')
})

test('a version gets a name, and an old one comes back', async ({ page }) => {
  await measureClient(page, 'Version Test', body)
  await startDress(page, 'Version dress')
  const before = await frontShape(page)
  await page.getByRole('button', { name: 'Versions' }).click()
  await page.getByLabel('Name this version').fill('As measured')
  await page.getByRole('button', { name: 'Save it' }).click()
  await expect(page.getByRole('listitem').filter({ hasText: 'As measured' })).toContainText('On the table')
  await page.getByRole('button', { name: 'Close', exact: true }).click()
  await changeAndSave(page, async () => {
    await neckDepth(page).fill('5')
    await page.keyboard.press('Enter')
  })
  await page.getByRole('button', { name: 'Versions' }).click()
  await page
    .getByRole('listitem')
    .filter({ hasText: 'As measured' })
    .getByRole('button', { name: 'Put back' })
    .click()
  await expect.poll(() => frontShape(page)).toEqual(before)
})

test('the studio has no barriers, in daylight or with the lamp on', async ({ page }) => {
  test.slow()
  await measureClient(page, 'Axe Test', body)
  await startDress(page, 'Axe dress')
  for (const leaf of ['Choices', 'Rules', 'Checks', 'Pieces']) {
    await page.getByRole('tab', { name: leaf }).click()
    await expect(page.getByRole('tab', { name: leaf })).toHaveAttribute('aria-selected', 'true')
    await expectAccessible(page)
  }
})

test('lists have no barriers, sort and search in the address', async ({ page }) => {
  await page.goto('/clients')
  await expectAccessible(page)
  await page.getByRole('link', { name: 'Name' }).click()
  await expect(page.getByRole('columnheader', { name: 'Name' })).toHaveAttribute('aria-sort', 'descending')
  await expect(page).toHaveURL(/direction=desc/)
  await page.getByRole('searchbox').fill('Nobody of that name')
  await page.getByRole('button', { name: 'Search' }).click()
  await expect(page.getByText('Nobody is found for')).toBeVisible()
  await page.goto('/drafts')
  await expectAccessible(page)
  await page.goto('/drafts/new')
  await expectAccessible(page)
})

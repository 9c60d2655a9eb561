import { expect, test } from '@playwright/test'
import { expectAccessible } from './support/axe'
import { body, measureClient, signInToDemo, startDress } from './support/demo'

test('a dress is ticked off at the table, and what is ticked stays', async ({ page }) => {
  await signInToDemo(page)
  await measureClient(page, 'Petronella Chalkline', body)
  await startDress(page, 'Chalked dress')
  await page.getByRole('button', { name: 'Print', exact: true }).click()
  const dialog = page.getByRole('dialog', { name: 'Print the pattern' })
  const waiting = page.waitForEvent('download')
  await dialog.getByRole('link', { name: 'Download the chalk guide (PDF)' }).click()
  expect((await waiting).suggestedFilename()).toBe('Chalked dress chalk guide.pdf')
  await dialog.getByRole('link', { name: 'Tick it off at the table' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Chalk guide: Chalked dress')
  await expect(page.getByText(/^0 of \d+ done$/)).toBeVisible()

  await page
    .getByRole('checkbox', { name: /From A straight down/ })
    .first()
    .check()
  await expect(page.getByText(/^1 of \d+ done$/)).toBeVisible()
  await page.reload()
  await expect(page.getByText(/^1 of \d+ done$/)).toBeVisible()
  await page.setViewportSize({ width: 390, height: 844 })
  await expectAccessible(page)
  await page.getByRole('button', { name: 'Begin again' }).click()
  await expect(page.getByText(/^0 of \d+ done$/)).toBeVisible()
})

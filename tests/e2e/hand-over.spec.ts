import { expect, test, type Page } from '@playwright/test'
import { body, measureClient, signInToDemo, startDress } from './support/demo'

const draftRow = (page: Page, name: string) => page.getByRole('row').filter({ hasText: name })

test('a draft is given to a maker, who sees and prints it, and taken back', async ({ page, browser }) => {
  test.setTimeout(120_000)
  await signInToDemo(page)
  await measureClient(page, 'Hanne Overgaard', body)
  await startDress(page, 'Handed dress')
  const address = page.url()
  await page.getByRole('link', { name: 'Back to Hanne Overgaard' }).click()
  await page.getByLabel('Made up by: Handed dress').selectOption('Wanjiru Hale')
  await expect(page.getByText('Wanjiru Hale now sees “Handed dress”').first()).toBeVisible()
  await page.goto('/drafts')
  await expect(page.getByLabel('Made up by: Handed dress')).toContainText('Wanjiru Hale')

  const workbench = await browser.newContext()
  const maker = await workbench.newPage()
  await signInToDemo(maker, 'maker')
  await maker.goto('/drafts')
  await expect(draftRow(maker, 'Handed dress')).toContainText('Hanne Overgaard')
  await expect(maker.getByLabel(/Made up by/)).toHaveCount(0)
  await maker.getByRole('link', { name: 'Handed dress' }).click()
  await expect(maker.getByRole('heading', { level: 1 })).toContainText('Handed dress')
  await expect(maker.getByRole('button', { name: 'Share', exact: true })).toHaveCount(0)
  await maker.getByRole('button', { name: 'Print', exact: true }).click()
  await expect(maker.getByRole('link', { name: 'Download the sheets (PDF)' })).toBeVisible()

  await page.getByLabel('Made up by: Handed dress').selectOption('Nobody yet')
  await expect(page.getByText('“Handed dress” is taken back').first()).toBeVisible()
  expect((await maker.goto(address))?.status()).toBe(404)
  await workbench.close()
})

test('a tutor starts a draft on a published size, without knowing any client', async ({ page }) => {
  await signInToDemo(page, 'tutor')
  await page.goto('/drafts')
  await page.getByRole('link', { name: 'New draft' }).click()
  await page.getByLabel('Name of the draft').fill('Tutor’s dress')
  await page.getByRole('button', { name: 'Start drafting' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Tutor’s dress')
  await page.getByRole('link', { name: 'Back to Drafts' }).click()
  await expect(draftRow(page, 'Tutor’s dress')).toBeVisible()
})

test('whoever starts a draft sees that it need not be for a client', async ({ page }) => {
  await signInToDemo(page)
  await page.goto('/drafts/new')
  await page.getByRole('link', { name: 'For nobody in particular' }).click()
  await page.getByLabel('Name of the draft').fill('Teaching dress')
  await page.getByLabel('A teaching draft').check()
  await page.getByRole('button', { name: 'Start drafting' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Teaching dress')
})

import { expect, test } from '@playwright/test'
import { joinAs } from './support/people'

test('a new draft starts from the unit and the allowances of the workroom', async ({ page }) => {
  test.setTimeout(120_000)
  await joinAs(page, { name: 'Marit Holm', workroom: 'Holm' })
  await page.goto('/settings')
  await page.getByLabel('Unit').selectOption('cm')
  await page.getByLabel('Hem').fill('4 cm')
  await page.getByLabel('Side seam').fill('3/4 in')
  await page.getByRole('button', { name: 'Save the settings' }).click()
  await expect(page.getByText('The settings are saved.').first()).toBeVisible()

  await page.goto('/drafts/new?for=nobody')
  await page.getByRole('button', { name: 'Start drafting' }).click()
  await expect(page.getByRole('textbox', { name: 'Neck depth, cm', exact: true })).toBeVisible()
  const drawer = page.getByRole('complementary', { name: 'Drawer' })
  await drawer.getByRole('button', { name: /^Allowances/ }).click()
  await expect(drawer.getByLabel('Hem allowance')).toHaveValue('4')
  await expect(drawer.getByLabel('Side allowance')).toHaveValue(/^(1\.9|3[/⁄]4 in)$/)

  await page.goto('/clients/new')
  await page.getByLabel('Name').fill('Ragna Dahl')
  await page.getByRole('button', { name: 'Add this client' }).click()
  await page.getByRole('link', { name: 'New measure card' }).click()
  await expect(page.getByRole('button', { name: 'cm', exact: true })).toHaveAttribute('aria-pressed', 'true')
})

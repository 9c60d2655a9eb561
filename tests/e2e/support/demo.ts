import { expect, type Page } from '@playwright/test'

/** Signs in one of the invented people of the demo workroom. */
export async function signInToDemo(
  page: Page,
  who: 'owner' | 'drafter' | 'tutor' | 'maker' | 'student' = 'owner',
): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(`${who}@linden-lane.example`)
  await page.getByLabel('Password', { exact: true }).fill(process.env.DEMO_PASSWORD ?? '')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).not.toHaveURL(/sign-in/, { timeout: 30_000 })
}

/** Adds a client and a measure card in inches. @returns the address of the card */
export async function measureClient(
  page: Page,
  name: string,
  values: Readonly<Record<string, string>>,
): Promise<string> {
  await page.goto('/clients/new')
  await page.getByLabel('Name').fill(name)
  await page.getByRole('button', { name: 'Add this client' }).click()
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible()
  await page.getByRole('link', { name: 'New measure card' }).click()
  for (const [label, text] of Object.entries(values)) await page.getByLabel(label, { exact: true }).fill(text)
  await expect(page.getByRole('status')).toHaveText('Saved')
  await expect(page).toHaveURL(/\/cards\/[0-9a-f-]{36}$/)
  return page.url()
}

/** Starts a flared dress from the card that is open. @returns the address of the draft */
export async function startDress(page: Page, name: string): Promise<string> {
  await page.getByRole('link', { name: 'Draft from this card' }).click()
  await page.getByLabel('Name of the draft').fill(name)
  await page.getByRole('button', { name: 'Start drafting' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText(name)
  await expect(page.getByLabel('Neck depth', { exact: false }).first()).toBeVisible()
  return page.url()
}

/** A body in inches, invented. */
export const body = { Bust: '36 1/2', Waist: '29', Hip: '39 1/4' } as const

/**
 * Changes the draft that is open and waits until the server has it. The words alone would not do: the bar says "Saved"
 * before a change as well as after it.
 */
export async function changeAndSave(page: Page, change: () => Promise<void>): Promise<void> {
  const answered = page.waitForResponse(
    (response) => response.request().method() === 'POST' && response.url().endsWith('/revisions'),
  )
  await change()
  await answered
  await expect(page.getByRole('banner').getByRole('status')).toHaveText('Saved')
}

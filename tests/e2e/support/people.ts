import { randomUUID } from 'node:crypto'
import { type Page, expect } from '@playwright/test'
import { waitForMail } from '../../support/mailbox'

export const password = 'plum tree by the river'

/** An address that nobody had before. */
export const newAddress = (name: string) => `${name}-${randomUUID()}@people.example`

/** Opens the link of the newest mail of this subject. */
export async function openMailedLink(page: Page, address: string, subject: RegExp): Promise<void> {
  const { text } = await waitForMail(address, subject)
  const [link] = /https?:\/\/\S+/.exec(text) ?? []
  if (!link) throw new Error(`There is no link in the mail: ${text}`)
  await page.goto(link)
}

/** Joins with a new workroom, through the mailbox, and ends in it. @returns the address to sign in with */
export async function joinAs(
  page: Page,
  { name, workroom, email = newAddress('owner') }: { name: string; workroom: string; email?: string },
): Promise<string> {
  await page.goto('/join')
  await page.getByLabel('Your name').fill(name)
  await page.getByLabel('Name of the workroom').fill(workroom)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByRole('button', { name: 'Join' }).click()
  await expect(page.getByRole('heading', { name: 'Look into your mailbox' })).toBeVisible()
  await openMailedLink(page, email, /Confirm your address/)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Open the workroom' }).click()
  await page.waitForURL(/\/clients$/)
  return email
}

/** Signs in and waits until the workroom is open. */
export async function signInAs(page: Page, email: string, word = password): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(word)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => url.pathname !== '/sign-in')
}

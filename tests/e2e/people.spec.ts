import { type Page, expect, test } from '@playwright/test'
import { expectAccessible } from './support/axe'
import { joinAs, newAddress, openMailedLink, password, signInAs } from './support/people'

async function signOut(page: Page, name: string): Promise<void> {
  await page.locator('summary', { hasText: name }).click()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await page.waitForURL(/\/sign-in/)
}

async function invite(page: Page, email: string, ...roles: string[]): Promise<void> {
  await page.goto('/members')
  await page.getByRole('button', { name: 'Invite somebody' }).click()
  const dialog = page.getByRole('dialog', { name: 'Invite somebody' })
  await dialog.getByLabel('E-mail address').fill(email)
  for (const role of roles) await dialog.getByRole('checkbox', { name: role }).check()
  await dialog.getByRole('button', { name: 'Send the invitation' }).click()
  await expect(dialog).toBeHidden()
}

test('join, invite, accept elsewhere, change roles, shut out', async ({ page, browser }) => {
  await page.goto('/join')
  await expectAccessible(page)
  await joinAs(page, { name: 'Ada Moss', workroom: 'Moss and thread' })
  await expect(page.getByText('Moss and thread').first()).toBeVisible()

  const helper = newAddress('helper')
  await invite(page, helper, 'Maker', 'Student')
  await expect(page.getByRole('main').getByRole('listitem')).toContainText([helper])
  await expectAccessible(page)

  const elsewhere = await browser.newContext()
  const other = await elsewhere.newPage()
  await openMailedLink(other, helper, /invites you to Moss and thread/)
  await expect(other.getByText('maker and student')).toBeVisible()
  await expectAccessible(other)
  await other.getByLabel('Your name').fill('Ben Reed')
  await other.getByLabel('Password', { exact: true }).fill('short')
  await other.getByRole('button', { name: 'Accept' }).click()
  await expect(other.getByText('At least 10 characters: three or four words are easy').first()).toBeVisible()
  await expect(other.getByLabel('Password', { exact: true })).toBeFocused()
  await other.getByLabel('Password', { exact: true }).fill(password)
  await other.getByRole('button', { name: 'Accept' }).click()
  await other.waitForURL(/\/drafts$/)
  await expect(other.getByRole('link', { name: 'Members' })).toBeHidden()

  await page.goto('/members')
  await expect(page.getByRole('row', { name: /Ben Reed/ })).toContainText('Maker, Student')
  await page.getByRole('button', { name: 'Change Ben Reed' }).click()
  await expect(page.getByRole('dialog')).toBeVisible()
  await expectAccessible(page)
  await page.getByRole('checkbox', { name: 'Owner' }).check()
  await page.getByRole('button', { name: 'Save the roles' }).click()
  await expect(page.getByRole('dialog')).toBeHidden()
  await expect(page.getByRole('row', { name: /Ben Reed/ })).toContainText('Owner, Maker, Student')
  await other.reload()
  await expect(other.getByRole('link', { name: 'Members' })).toBeVisible()

  await page.getByRole('button', { name: 'Change Ben Reed' }).click()
  await page.getByRole('button', { name: 'Shut out' }).click()
  await expect(page.getByRole('dialog')).toBeHidden()
  await expect(page.getByRole('row', { name: /Ben Reed/ })).toContainText('Shut out')
  await other.reload()
  await expect(other.getByRole('heading', { name: 'You are in no workroom' })).toBeVisible()
  await expectAccessible(other)
  await elsewhere.close()
})

test('a second workroom: accept when signed in, switch, and be somebody else there', async ({
  page,
  browser,
}) => {
  await joinAs(page, { name: 'Ada Moss', workroom: 'Moss and thread' })
  const elsewhere = await browser.newContext()
  const other = await elsewhere.newPage()
  const email = await joinAs(other, { name: 'Cleo Vale', workroom: 'Vale school of sewing' })
  await signOut(other, 'Cleo Vale')

  await invite(page, email, 'Tutor')
  await openMailedLink(other, email, /invites you/)
  await other.getByRole('link', { name: 'Sign in to accept' }).click()
  await expect(other.getByRole('heading', { name: 'Sign in to your workroom' })).toBeVisible()
  await other.getByLabel('E-mail address').fill(email)
  await other.getByLabel('Password', { exact: true }).fill(password)
  await other.getByRole('button', { name: 'Sign in' }).click()
  await other.getByRole('button', { name: 'Accept' }).click()
  await other.waitForURL(/\/drafts$/)
  await expect(other.getByRole('link', { name: 'Clients' })).toBeHidden()

  await other.getByRole('link', { name: /switch workroom/ }).click()
  await expect(other.getByRole('heading', { name: 'Choose a workroom' })).toBeVisible()
  // At once, not after a while: this is when a screen reader reads it out.
  expect(await other.title()).toBe('Workrooms · Chalkfold')
  await expectAccessible(other)
  await other.getByRole('button', { name: 'Vale school of sewing' }).click()
  await other.waitForURL(/\/clients$/)
  await expect(other.getByText('Vale school of sewing').first()).toBeVisible()
  await elsewhere.close()
})

test('forgotten password: the link works once, and every device is signed out', async ({ page, browser }) => {
  const email = await joinAs(page, { name: 'Dora Finch', workroom: 'Finch' })
  const elsewhere = await browser.newContext()
  const other = await elsewhere.newPage()
  await other.goto('/sign-in')
  await expectAccessible(other)
  await other.getByRole('link', { name: 'Choose a new one' }).click()
  await expect(other.getByRole('heading', { name: 'Forgotten password' })).toBeVisible()
  await other.getByLabel('E-mail address').fill(email)
  await expectAccessible(other)
  await other.getByRole('button', { name: 'Send the link' }).click()
  await openMailedLink(other, email, /Choose a new password/)
  const link = other.url()
  await expectAccessible(other)
  await other.getByLabel('New password').fill('password1234')
  await other.getByRole('button', { name: 'Set the password' }).click()
  await expect(other.getByText('one of the first that are guessed')).toBeVisible()
  await other.getByLabel('New password').fill('seven green buttons')
  await other.getByRole('button', { name: 'Set the password' }).click()
  await other.waitForURL(/\/clients$/)

  await page.goto('/members')
  await expect(page).toHaveURL(/\/sign-in\?callbackUrl=%2Fmembers/)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByText('The e-mail address or the password is not right.')).toBeVisible()
  await page.getByLabel('Password', { exact: true }).fill('seven green buttons')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL(/\/members$/)

  await page.goto(link)
  await expect(page.getByRole('heading', { name: 'This link works no more' })).toBeVisible()
  await expectAccessible(page)
  await elsewhere.close()
})

test('a forgotten device is seen on the account page and signed out from there', async ({
  page,
  browser,
}) => {
  const email = await joinAs(page, { name: 'Ines Fern', workroom: 'Fern' })
  const elsewhere = await browser.newContext({
    userAgent:
      'Mozilla/5.0 (Linux; Android 15; Pixel 8) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/142.0.0.0 Mobile Safari/537.36',
  })
  const phone = await elsewhere.newPage()
  await signInAs(phone, email)

  await page.goto('/account')
  await expect(page.getByRole('listitem').filter({ hasText: 'this device' })).toContainText(/on Linux/)
  const other = page.getByRole('listitem').filter({ hasText: 'Chrome on Android' })
  await expect(other).toContainText('Last seen')
  await expectAccessible(page)
  await other.getByRole('button', { name: 'Sign out Chrome on Android' }).click()
  await expect(other).toHaveCount(0)

  await phone.goto('/clients')
  await expect(phone).toHaveURL(/\/sign-in/)
  await page.reload()
  await expect(page.getByRole('heading', { name: 'Your account' })).toBeVisible()
  await elsewhere.close()
})

test('settings keep what was typed, and say what is wrong where it is', async ({ page }) => {
  const email = await joinAs(page, { name: 'Eva Lark', workroom: 'Lark' })
  await page.goto('/settings')
  await expectAccessible(page)
  await page.getByLabel('Shoulder').fill('1/0')
  await page.getByRole('button', { name: 'Save the settings' }).click()
  await expect(page.getByLabel('Shoulder')).toBeFocused()
  await expect(page.getByLabel('Shoulder')).toHaveAccessibleDescription(/.+/)
  await page.getByLabel('Shoulder').fill('5/8')
  await page.getByLabel('Hem').fill('3 cm')
  await page.getByLabel('Currency').selectOption('NGN')
  await page.getByLabel('Unit').selectOption('cm')
  await page.getByRole('button', { name: 'Save the settings' }).click()
  await expect(page.getByText('The settings are saved.').first()).toBeVisible()
  await page.reload()
  await expect(page.getByLabel('Shoulder')).toHaveValue('5/8 in')
  await expect(page.getByLabel('Hem')).toHaveValue('3 cm')
  await expect(page.getByLabel('Currency')).toHaveValue('NGN')

  await page.goto('/account')
  await expectAccessible(page)
  await page.getByLabel('Present password').fill(password)
  await page.getByLabel('New password').fill('eight silver pins')
  await page.getByRole('button', { name: 'Change the password' }).click()
  await expect(page.getByText('The password is changed, and every other').first()).toBeVisible()
  await page.reload()
  await signOut(page, 'Eva Lark')
  await signInAs(page, email, 'eight silver pins')
})

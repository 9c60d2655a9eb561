import { createTransport } from 'nodemailer'
import { expect, test } from 'vitest'
import { mailTo, waitForMail } from '../support/mailbox'

async function send(to: string, subject: string, text: string): Promise<void> {
  const transport = createTransport(process.env.SMTP_URL)
  await transport.sendMail({ from: process.env.MAIL_FROM, to, subject, text })
  transport.close()
}

test('the local mailbox keeps what is sent, for its recipient', async () => {
  await send('Ada@example.test', 'Your invitation', 'Join here: http://localhost/join?token=abc&x=1')
  const message = await waitForMail('ada@example.test', /invitation/)
  expect(message.text).toContain('http://localhost/join?token=abc&x=1')
  expect((await mailTo('bea@example.test')).map(({ subject }) => subject)).not.toContain('Your invitation')
})

test('its page shows a message as text, whatever markup it brings', async () => {
  await send('cleo@example.test', '<img src=x onerror=alert(1)>', '<script>alert(1)</script>')
  await waitForMail('cleo@example.test', /img/)
  const page = await (await fetch(`${process.env.MAIL_PAGE_URL}/`)).text()
  expect(page).toContain('&#60;script&#62;alert(1)')
  expect(page).not.toContain('<script')
  expect(page).not.toContain('<img')
})

import 'server-only'
import { type Transporter, createTransport } from 'nodemailer'
import { appOrigin } from '../config'
import { type Letter, letterHtml, letterText } from './letter'

let transport: Transporter | undefined

function transporter(): Transporter {
  const url = process.env.SMTP_URL
  if (!url) throw new Error('SMTP_URL is not set: see .env.example.')
  const patience = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 }
  const { protocol, hostname, port, username, password } = new URL(url)
  const secure = protocol === 'smtps:'
  return (transport ??= createTransport({
    ...patience,
    host: hostname,
    port: Number(port) || (secure ? 465 : 587),
    secure,
    ...(username ? { auth: { user: decodeURIComponent(username), pass: decodeURIComponent(password) } } : {}),
  }))
}

/**
 * Sends a letter, text and HTML.
 * @param jobId stands in the Message-ID, so that a letter sent twice after a lost answer is seen as one
 * @throws Error when the mail server does not take it
 */
export async function sendLetter(letter: Letter, jobId: string): Promise<void> {
  const from = process.env.MAIL_FROM
  if (!from) throw new Error('MAIL_FROM is not set: see .env.example.')
  await transporter().sendMail({
    from,
    to: { name: '', address: letter.to },
    subject: letter.subject,
    text: letterText(letter),
    html: letterHtml(letter),
    messageId: `<${jobId}@${new URL(appOrigin()).hostname}>`,
    headers: { 'Auto-Submitted': 'auto-generated' },
    disableFileAccess: true,
    disableUrlAccess: true,
  })
}

import { join } from 'node:path'
import { listenHttp } from '../http.mjs'
import { pageHeaders } from '../page.mjs'
import { portLike } from '../ports.mjs'
import { openMailbox } from './mailbox.mjs'
import { mailPage } from './page.mjs'
import { listenForMail } from './smtp.mjs'

/**
 * A local stand-in for a mail service: SMTP in, a page (`/`) and JSON (`/messages.json?to=address`) out.
 * @param {{ folder: string, remembered: { smtpPort?: number, pagePort?: number } }} options
 * @returns {Promise<{ smtpUrl: string, pageUrl: string, ports: { smtpPort: number, pagePort: number }, stop: () => Promise<void> }>}
 */
export async function startMail({ folder, remembered }) {
  const mailbox = openMailbox(join(folder, 'mail'))
  const smtpPort = await portLike(remembered.smtpPort)
  const smtp = await listenForMail(mailbox, smtpPort)
  const pagePort = await portLike(remembered.pagePort)
  const page = await listenHttp(pagePort, (request, response) => {
    const { pathname, searchParams } = new URL(request.url, 'http://localhost')
    if (pathname === '/') {
      response.writeHead(200, pageHeaders()).end(mailPage(mailbox.list()))
    } else if (pathname === '/messages.json') {
      const messages = mailbox.list(searchParams.get('to') ?? undefined)
      response
        .writeHead(200, { ...pageHeaders(), 'content-type': 'application/json' })
        .end(JSON.stringify(messages))
    } else {
      response.writeHead(404, pageHeaders()).end()
    }
  })
  return {
    smtpUrl: `smtp://127.0.0.1:${smtpPort}`,
    pageUrl: `http://127.0.0.1:${pagePort}`,
    ports: { smtpPort, pagePort },
    stop: async () => {
      await page.stop()
      await smtp.stop()
    },
  }
}

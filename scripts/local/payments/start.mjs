import { join } from 'node:path'
import { listenHttp } from '../http.mjs'
import { pageHeaders } from '../page.mjs'
import { portLike } from '../ports.mjs'
import { answerApi } from './api.mjs'
import { openBooks } from './books.mjs'
import { createCourier } from './courier.mjs'
import { answerPages } from './hosted.mjs'
import { rehearse } from './rehearsal.mjs'
import { expireOverdue } from './sessions.mjs'

const largest = 256 * 1024

/**
 * A local stand-in for a card-payment service: its API, a page (`/pay/…`) on which a checkout is paid or declined, signed
 * events to the application, and a page (`/`) of what happened. Tests hold and reorder events through `/rehearsal`.
 * @param {object} options
 * @param {string} options.folder data folder of the installation; the books stand in `payments` inside
 * @param {{ port?: number }} options.remembered
 * @param {string} options.secretKey
 * @param {string} options.webhookSecret
 * @param {string} options.webhookUrl where events are brought
 * @returns {Promise<{ endpoint: string, ports: { port: number }, stop: () => Promise<void> }>}
 */
export async function startPayments({ folder, remembered, secretKey, webhookSecret, webhookUrl }) {
  const port = await portLike(remembered.port)
  const endpoint = `http://127.0.0.1:${port}`
  const books = openBooks(join(folder, 'payments'))
  const courier = createCourier({ books, webhookUrl, webhookSecret })
  const desk = { books, courier, endpoint, secretKey }
  const behaviour = { drop: 0 }

  const server = await listenHttp(port, async (request, response) => {
    const { method, url, headers } = request
    const asked = { method, url, headers, body: await bodyOf(request) }
    if (url.startsWith('/v1/') || url === '/rehearsal') {
      const {
        status,
        body,
        headers: more,
      } = url === '/rehearsal' ? await rehearse(desk, behaviour, asked) : answerApi(desk, asked)
      if (url !== '/rehearsal' && behaviour.drop-- > 0) return response.destroy()
      behaviour.drop = Math.max(0, behaviour.drop)
      return response
        .writeHead(status, { 'content-type': 'application/json', ...more })
        .end(JSON.stringify(body, null, 2))
    }
    const { status, location, page, forms } = await answerPages(desk, asked)
    response.writeHead(status, { ...pageHeaders(forms), ...(location && { location }) }).end(page)
  })
  const clock = setInterval(() => {
    if (!expireOverdue(books, courier.emit)) return
    books.save()
    courier.wake()
  }, 1000)
  return {
    endpoint,
    ports: { port },
    stop: async () => {
      clearInterval(clock)
      await Promise.all([server.stop(), courier.stop()])
    },
  }
}

async function bodyOf(request) {
  const parts = []
  let size = 0
  for await (const part of request) {
    size += part.length
    if (size <= largest) parts.push(part)
  }
  if (size > largest) throw new Error('The request is larger than any that the service takes.')
  return Buffer.concat(parts).toString('utf8')
}

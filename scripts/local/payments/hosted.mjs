import { localPage } from '../page.mjs'
import { ApiError } from './errors.mjs'
import { addressFor, closedPage, overviewPage, payPage } from './pages.mjs'
import { decline, pay } from './sessions.mjs'

/**
 * Answers for the pages that people see.
 * @param {import('./api.mjs').Desk} desk
 * @param {{ method: string, url: string, headers: import('node:http').IncomingHttpHeaders, body: string }} request
 * @returns {Promise<{ status: number, location?: string, page?: string, forms?: string }>} forms: where its form may lead
 */
export async function answerPages(desk, { method, url, headers, body }) {
  const site = headers['sec-fetch-site']
  if (method === 'POST' && site !== undefined && site !== 'same-origin')
    return refusal(403, 'Use the page itself.')
  const [, place, id] = url.split('?')[0].split('/')
  try {
    if (place === '' && method === 'GET') return { status: 200, page: overviewPage(desk.books) }
    if (place === 'events' && method === 'POST') {
      await desk.courier.sendNow([id])
      return { status: 303, location: '/' }
    }
    if (place === 'pay') {
      const session = desk.books.find('cs_test', id)
      return method === 'POST' ? choose(desk, session, body) : show(desk, session)
    }
  } catch (error) {
    if (!(error instanceof ApiError)) throw error
  }
  return refusal(404, 'There is nothing here.')
}

function show({ books }, session) {
  if (session.status !== 'open') return { status: 200, page: closedPage(session) }
  const { lines } = books.kept.lines[session.id]
  const declined = Boolean(books.kept.things[session.payment_intent]?.last_payment_error)
  const forms = new URL(session.success_url).origin
  return { status: 200, page: payPage(session, lines, declined), forms }
}

function choose({ books, courier }, session, body) {
  const choice = new URLSearchParams(body).get('choice')
  if (choice === 'pay') pay(books, session, courier.emit)
  if (choice === 'decline') decline(books, session, courier.emit)
  books.save()
  courier.wake()
  const paid = session.status === 'complete'
  return { status: 303, location: paid ? addressFor(session, session.success_url) : `/pay/${session.id}` }
}

const refusal = (status, words) => ({ status, page: localPage('Local payments', `<p>${words}</p>`) })

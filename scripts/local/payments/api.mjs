import { randomBytes, timingSafeEqual } from 'node:crypto'
import { ApiError } from './errors.mjs'
import { reader, readForm } from './form.mjs'
import { refund } from './refunds.mjs'
import { expireSession, openSession } from './sessions.mjs'

/**
 * @typedef {object} Desk what the service works with
 * @property {ReturnType<import('./books.mjs').openBooks>} books
 * @property {ReturnType<import('./courier.mjs').createCourier>} courier
 * @property {string} endpoint
 * @property {string} secretKey
 */

/** @type {[method: string, path: RegExp, work: (desk: Desk, form: ReturnType<typeof reader>, id: string) => object][]} */
const routes = [
  ['POST', /^\/v1\/checkout\/sessions$/, ({ books, endpoint }, form) => openSession(books, form, endpoint)],
  ['GET', /^\/v1\/checkout\/sessions\/([^/]+)$/, ({ books }, _form, id) => books.find('cs_test', id)],
  [
    'POST',
    /^\/v1\/checkout\/sessions\/([^/]+)\/expire$/,
    ({ books, courier }, form, id) => {
      form.end()
      const session = books.find('cs_test', id)
      expireSession(books, session, courier.emit)
      return session
    },
  ],
  [
    'GET',
    /^\/v1\/checkout\/sessions\/([^/]+)\/line_items$/,
    ({ books }, form, id) => {
      const { lines } = books.kept.lines[books.find('cs_test', id).id]
      const most = form.whole('limit', { least: 1, most: 100 }) ?? 10
      return {
        object: 'list',
        url: `/v1/checkout/sessions/${id}/line_items`,
        has_more: lines.length > most,
        data: lines.slice(0, most),
      }
    },
  ],
  ['GET', /^\/v1\/payment_intents\/([^/]+)$/, ({ books }, _form, id) => books.find('pi', id)],
  ['GET', /^\/v1\/charges\/([^/]+)$/, ({ books }, _form, id) => books.find('ch', id)],
  ['POST', /^\/v1\/refunds$/, ({ books, courier }, form) => refund(books, form, courier.emit)],
  [
    'GET',
    /^\/v1\/refunds$/,
    ({ books }, form) => {
      const intent = form.text('payment_intent')
      const most = form.whole('limit', { least: 1, most: 100 })
      return books.listed('refund', '/v1/refunds', {
        most,
        keep: (each) => !intent || each.payment_intent === intent,
      })
    },
  ],
  ['GET', /^\/v1\/refunds\/([^/]+)$/, ({ books }, _form, id) => books.find('re', id)],
  [
    'GET',
    /^\/v1\/events$/,
    ({ books }, form) => {
      const type = form.text('type')
      const most = form.whole('limit', { least: 1, most: 100 })
      return books.listed('event', '/v1/events', { most, keep: (each) => !type || each.type === type })
    },
  ],
  ['GET', /^\/v1\/events\/([^/]+)$/, ({ books }, _form, id) => books.find('evt', id)],
]

/**
 * Answers one request of the service's API.
 * @param {Desk} desk
 * @param {{ method: string, url: string, headers: import('node:http').IncomingHttpHeaders, body: string }} request
 * @returns {{ status: number, body: object, headers: Record<string, string> }}
 */
export function answerApi(desk, request) {
  const headers = { 'request-id': `req_${randomBytes(7).toString('hex')}` }
  try {
    requireKey(request.headers.authorization, desk.secretKey)
    const key = request.headers['idempotency-key']
    if (request.method !== 'POST' || !key) return { status: 200, body: perform(desk, request), headers }
    return { ...once(desk, key, request, headers), headers: { ...headers, 'idempotency-key': key } }
  } catch (error) {
    if (!(error instanceof ApiError)) throw error
    return { status: error.status, body: error.body, headers }
  }
}

/** A request sent again under its key gets the answer it had, and nothing is done twice. */
function once({ books, ...desk }, key, request) {
  const said = `${request.url} ${request.body}`
  const before = books.kept.replies[key]
  if (before && before.said !== said)
    throw new ApiError(400, {
      type: 'idempotency_error',
      message: `Keys for idempotent requests can only be used with the same parameters they were first used with. Try using a key other than '${key}' if you meant to execute a different request.`,
    })
  if (before) return { status: 200, body: before.body }
  const body = perform({ books, ...desk }, request)
  books.kept.replies[key] = { said, body }
  books.save()
  return { status: 200, body }
}

function perform(desk, { method, url, body }) {
  const [path, query = ''] = url.split('?')
  const route = routes.find(([verb, pattern]) => verb === method && pattern.test(path))
  if (!route)
    throw new ApiError(404, {
      message: `Unrecognized request URL (${method}: ${path}): the local service does not have it.`,
    })
  const [, pattern, work] = route
  const form = reader(readForm(method === 'POST' ? body : query))
  const expand = form.texts('expand')
  const thing = work(desk, form, pattern.exec(path)[1])
  form.end()
  if (method === 'POST') {
    desk.books.save()
    desk.courier.wake()
  }
  return desk.books.shown(thing, expand)
}

function requireKey(authorization = '', secretKey) {
  const given = Buffer.from(/^Bearer (\S+)$/.exec(authorization)?.[1] ?? '')
  const wanted = Buffer.from(secretKey)
  if (given.length === wanted.length && timingSafeEqual(given, wanted)) return
  const message =
    given.length === 0
      ? 'You did not provide an API key: send it as a bearer token.'
      : `Invalid API Key provided: ${given.toString().slice(0, 8)}****`
  throw new ApiError(401, { message })
}

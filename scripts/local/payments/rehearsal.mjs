import { answerApi } from './api.mjs'
import { ApiError } from './errors.mjs'

/**
 * What a real network does at the worst moment, on request of a test: `{held}` keeps events back, `{send: [ids]}` brings
 * these now, in this order and again if need be, `{drop}` loses so many of the next answers after the work is done.
 * @param {import('./api.mjs').Desk} desk
 * @param {{ drop: number }} behaviour changed in place
 * @param {{ method: string, url: string, headers: import('node:http').IncomingHttpHeaders, body: string }} request
 */
export async function rehearse(desk, behaviour, request) {
  const allowed = answerApi(desk, { ...request, method: 'GET', url: '/v1/events', body: '' })
  if (allowed.status !== 200) return allowed
  const { held, send = [], drop } = JSON.parse(request.body)
  if (typeof held === 'boolean') desk.courier.hold(held)
  if (Number.isInteger(drop)) behaviour.drop = drop
  try {
    return { status: 200, body: { sent: await desk.courier.sendNow(send) } }
  } catch (error) {
    if (!(error instanceof ApiError)) throw error
    return { status: error.status, body: error.body }
  }
}

import { createHmac } from 'node:crypto'
import { seconds } from './books.mjs'

const patience = 10_000
const tries = 12
/** Milliseconds before the next try: a second, then twice as long each time, a minute at most. */
const pauseAfter = (done) => Math.min(1000 * 2 ** (done - 1), 60_000)

/**
 * The header that proves where an event comes from: a keyed hash over the time and the bytes of the body.
 * @param {string} body
 * @param {string} secret
 */
export function signatureOf(body, secret, time = seconds()) {
  return `t=${time},v1=${createHmac('sha256', secret).update(`${time}.${body}`).digest('hex')}`
}

/**
 * Brings events to the application, one after another in the order they happened, and again and again until it takes them.
 * @param {object} options
 * @param {ReturnType<import('./books.mjs').openBooks>} options.books
 * @param {string} options.webhookUrl
 * @param {string} options.webhookSecret
 */
export function createCourier({ books, webhookUrl, webhookSecret }) {
  const { deliveries } = books.kept
  let held = false
  const leaving = new AbortController()
  let timer
  let walking = Promise.resolve()

  /** @returns {Promise<number>} the status of the answer, 0 when there was none */
  async function carry(id) {
    const body = JSON.stringify(books.shown(books.find('evt', id)), null, 2)
    try {
      const response = await fetch(webhookUrl, {
        method: 'POST',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          'stripe-signature': signatureOf(body, webhookSecret),
          'user-agent': 'Stripe/1.0 (local)',
        },
        body,
        redirect: 'manual',
        signal: AbortSignal.any([AbortSignal.timeout(patience), leaving.signal]),
      })
      await response.body?.cancel()
      return response.status
    } catch {
      return 0
    }
  }

  async function send(id) {
    const status = await carry(id)
    // What was under way when everything stops counts as not tried.
    if (leaving.signal.aborted) return status
    const delivery = deliveries.find((each) => each.event === id)
    delivery.tries += 1
    delivery.status = status
    delivery.taken ||= status >= 200 && status < 300
    delivery.due = Date.now() + pauseAfter(delivery.tries)
    books.save()
    return status
  }

  const waiting = () => deliveries.filter(({ taken, tries: done }) => !taken && done < tries)

  async function walk() {
    for (const { event, due } of waiting())
      if (!held && !leaving.signal.aborted && due <= Date.now()) await send(event)
  }

  /** Goes now, and again when the next one is due. */
  function wake() {
    clearTimeout(timer)
    walking = walking.then(walk)
    void walking.then(() => {
      const next = waiting()
      if (held || leaving.signal.aborted || next.length === 0) return
      clearTimeout(timer)
      timer = setTimeout(wake, Math.max(0, Math.min(...next.map(({ due }) => due)) - Date.now()))
    })
  }
  wake()

  return {
    /** Writes an event down and brings it as soon as may be. */
    emit(type, thing) {
      const event = books.make('evt', {
        api_version: null,
        data: { object: books.shown(thing) },
        pending_webhooks: 1,
        request: { id: null, idempotency_key: null },
        type,
      })
      deliveries.push({ event: event.id, tries: 0, status: null, taken: false, due: 0 })
    },

    wake,

    /** Sends these events now, in this order, whether or not they have been sent before. */
    async sendNow(ids) {
      const sent = []
      for (const id of ids) sent.push({ id, status: await send(books.find('evt', id).id) })
      return sent
    },

    /** While events are held, only sendNow sends any. */
    hold(on) {
      held = on
      wake()
    },

    /** @returns {Promise<void>} when nothing is under way any more */
    stop() {
      leaving.abort()
      clearTimeout(timer)
      return walking
    },
  }
}

import { mkdtempSync, rmSync } from 'node:fs'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { text } from 'node:stream/consumers'
import Stripe from 'stripe'
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { startPayments } from '../../scripts/local/payments/start.mjs'

const secretKey = 'sk_test_local_a-key-of-the-tests'
const webhookSecret = 'whsec_a-secret-of-the-tests'
const folder = mkdtempSync(join(tmpdir(), 'chalkfold-payments-'))

/** The application's side: keeps what it was told, proved by the client library's own check. */
const told: Stripe.Event[] = []
let refusing = 0
let app: Server
let webhookUrl: string
let service: Awaited<ReturnType<typeof startPayments>>
let stripe: Stripe

const start = () => startPayments({ folder, remembered: {}, secretKey, webhookSecret, webhookUrl })

function clientWith(key: string) {
  const { hostname, port } = new URL(service.endpoint)
  return new Stripe(key, { host: hostname, port, protocol: 'http', maxNetworkRetries: 2, telemetry: false })
}

beforeAll(async () => {
  app = createServer((request, response) => {
    void text(request).then((body) => {
      if (refusing > 0) {
        refusing -= 1
        response.writeHead(500).end()
        return
      }
      const signature = request.headers['stripe-signature'] ?? ''
      told.push(Stripe.webhooks.constructEvent(body, signature, webhookSecret))
      response.writeHead(200).end()
    })
  })
  await new Promise<void>((resolve) => app.listen(0, '127.0.0.1', resolve))
  webhookUrl = `http://127.0.0.1:${(app.address() as AddressInfo).port}/told`
  service = await start()
  stripe = clientWith(secretKey)
})

afterAll(async () => {
  await service.stop()
  await new Promise((resolve) => app.close(resolve))
  rmSync(folder, { recursive: true, force: true })
})

beforeEach(async () => {
  refusing = 0
  await rehearse({ held: false })
  told.length = 0
})

async function rehearse(body: object) {
  const answer = await fetch(`${service.endpoint}/rehearsal`, {
    method: 'POST',
    headers: { authorization: `Bearer ${secretKey}` },
    body: JSON.stringify(body),
  })
  return (await answer.json()) as { sent: { id: string; status: number }[] }
}

const deposit = (more: Stripe.Checkout.SessionCreateParams = {}): Stripe.Checkout.SessionCreateParams => ({
  mode: 'payment',
  line_items: [
    {
      quantity: 2,
      price_data: { currency: 'eur', unit_amount: 2450, product_data: { name: 'Deposit, summer dress' } },
    },
  ],
  success_url: 'https://workroom.test/paid?checkout={CHECKOUT_SESSION_ID}',
  cancel_url: 'https://workroom.test/orders/7',
  client_reference_id: 'order-7',
  customer_email: 'ottilie@people.example',
  metadata: { order: '7' },
  ...more,
})
const open = (more?: Stripe.Checkout.SessionCreateParams) => stripe.checkout.sessions.create(deposit(more))

/** Presses a button of the page. */
const choose = (session: { url: string | null }, choice: string) =>
  fetch(session.url ?? '', {
    method: 'POST',
    body: new URLSearchParams({ choice }),
    redirect: 'manual',
  })
const types = () => told.map(({ type }) => type)
const toldOf = (count: number) => vi.waitFor(() => expect(told).toHaveLength(count), { timeout: 10_000 })
const again = (id: string) => stripe.checkout.sessions.retrieve(id)

async function paid() {
  const session = await open()
  await choose(session, 'pay')
  await toldOf(3)
  told.length = 0
  const { payment_intent: intent } = await again(session.id)
  return { session, intent: String(intent) }
}

describe('the local payment service, asked by the client library', () => {
  it('opens a checkout with the sum of its lines', async () => {
    const session = await open()
    expect(session).toMatchObject({
      amount_total: 4900,
      currency: 'eur',
      status: 'open',
      payment_status: 'unpaid',
      client_reference_id: 'order-7',
      metadata: { order: '7' },
      payment_intent: null,
    })
    const { data } = await stripe.checkout.sessions.listLineItems(session.id)
    expect(data).toMatchObject([{ description: 'Deposit, summer dress', quantity: 2, amount_total: 4900 }])
    const page = await (await fetch(session.url ?? '')).text()
    expect(page).toContain('€49.00')
    expect(page).toContain('no money moves')
  })

  it('is paid on its page, tells so with a signature that the library accepts, and leads back', async () => {
    const session = await open()
    const answer = await choose(session, 'pay')
    expect(answer.headers.get('location')).toBe(`https://workroom.test/paid?checkout=${session.id}`)
    await toldOf(3)
    expect(types()).toEqual(['charge.succeeded', 'payment_intent.succeeded', 'checkout.session.completed'])
    expect(told.at(-1)?.data.object).toMatchObject({ id: session.id, payment_status: 'paid' })
    const now = await stripe.checkout.sessions.retrieve(session.id, {
      expand: ['payment_intent.latest_charge'],
    })
    expect(now).toMatchObject({
      status: 'complete',
      payment_intent: { status: 'succeeded', amount_received: 4900, latest_charge: { amount: 4900 } },
    })
  })

  it('is paid once, however often the button is pressed', async () => {
    const session = await open()
    await Promise.all([choose(session, 'pay'), choose(session, 'pay'), choose(session, 'decline')])
    await toldOf(3)
    expect(
      (await stripe.events.list({ type: 'checkout.session.completed' })).data[0]?.data.object,
    ).toMatchObject({
      id: session.id,
    })
    expect(new Set(types()).size).toBe(3)
  })

  it('stays open after the card was declined, and is paid with the next', async () => {
    const session = await open()
    await choose(session, 'decline')
    await toldOf(1)
    expect(told[0]).toMatchObject({
      type: 'payment_intent.payment_failed',
      data: { object: { last_payment_error: { code: 'card_declined' } } },
    })
    expect(await (await fetch(session.url ?? '')).text()).toContain('The card was declined')
    expect((await again(session.id)).status).toBe('open')
    await choose(session, 'pay')
    await toldOf(4)
    expect((await again(session.id)).payment_status).toBe('paid')
  })

  it('ends unpaid when it is called off, and takes nothing then', async () => {
    const session = await open()
    await stripe.checkout.sessions.expire(session.id)
    await choose(session, 'pay')
    await toldOf(1)
    expect(types()).toEqual(['checkout.session.expired'])
    expect((await again(session.id)).payment_status).toBe('unpaid')
    await expect(stripe.checkout.sessions.expire(session.id)).rejects.toMatchObject({ statusCode: 400 })
  })

  it('gives back a part, then the rest, and no more', async () => {
    const { intent } = await paid()
    const give = (amount?: number) => stripe.refunds.create({ payment_intent: intent, amount })
    expect(await give(1000)).toMatchObject({ amount: 1000, status: 'succeeded' })
    await expect(give(3901)).rejects.toMatchObject({ type: 'StripeInvalidRequestError', param: 'amount' })
    expect(await give()).toMatchObject({ amount: 3900 })
    await expect(give()).rejects.toMatchObject({ code: 'charge_already_refunded' })
    await toldOf(4)
    const charges = told.filter(({ type }) => type === 'charge.refunded').map(({ data }) => data.object)
    expect(charges).toMatchObject([
      { amount_refunded: 1000, refunded: false },
      { amount_refunded: 4900, refunded: true },
    ])
    const { data } = await stripe.refunds.list({ payment_intent: intent })
    expect(data.map(({ amount }) => amount)).toEqual([3900, 1000])
  })

  it('does a request once under its key, also when the answer was lost on its way', async () => {
    const first = await stripe.checkout.sessions.create(deposit(), { idempotencyKey: 'order-7-deposit' })
    const second = await stripe.checkout.sessions.create(deposit(), { idempotencyKey: 'order-7-deposit' })
    expect(second.id).toBe(first.id)
    const other = stripe.checkout.sessions.create(deposit({ client_reference_id: 'order-8' }), {
      idempotencyKey: 'order-7-deposit',
    })
    await expect(other).rejects.toMatchObject({ type: 'StripeIdempotencyError' })

    const { intent } = await paid()
    await rehearse({ drop: 1 })
    const refund = await stripe.refunds.create({ payment_intent: intent, amount: 700 })
    const { data } = await stripe.refunds.list({ payment_intent: intent })
    expect(data.map(({ id }) => id)).toEqual([refund.id])
  })

  it('refuses another key, a thing that is not there, and what it does not understand', async () => {
    await expect(clientWith('sk_test_other').checkout.sessions.create(deposit())).rejects.toMatchObject({
      type: 'StripeAuthenticationError',
    })
    await expect(again('cs_test_nothing')).rejects.toMatchObject({
      statusCode: 404,
      code: 'resource_missing',
    })
    const typo = { ...deposit(), sucess_url: 'https://workroom.test' }
    await expect(stripe.checkout.sessions.create(typo)).rejects.toMatchObject({
      code: 'parameter_unknown',
      param: 'sucess_url',
    })
    await expect(open({ success_url: 'javascript:alert(1)' })).rejects.toMatchObject({ code: 'url_invalid' })
    await expect(open({ line_items: [] })).rejects.toMatchObject({ param: 'line_items' })
  })

  it('shows names as they are, and nothing in them runs', async () => {
    const name = '<script>alert(1)</script> & "lace"'
    const price_data = { currency: 'jpy', unit_amount: 500, product_data: { name } }
    const page = await (
      await fetch((await open({ line_items: [{ quantity: 1, price_data }] })).url ?? '')
    ).text()
    expect(page).not.toContain('<script>')
    expect(page).toContain('&#60;script&#62;')
    expect(page).toContain('JP¥500')
  })
})

describe('what it tells the application', () => {
  it('is told again until it is taken', async () => {
    refusing = 2
    const session = await open()
    await choose(session, 'decline')
    await toldOf(1)
    expect(types()).toEqual(['payment_intent.payment_failed'])
  })

  it('is held, and sent twice and in another order, when a test wants so', async () => {
    await rehearse({ held: true })
    const session = await open()
    await choose(session, 'pay')
    const { data } = await stripe.events.list({ limit: 3 })
    const [completed, succeeded] = data.map(({ id }) => id)
    const { sent } = await rehearse({ send: [completed, completed, succeeded] })
    expect(sent.map(({ status }) => status)).toEqual([200, 200, 200])
    expect(types()).toEqual([
      'checkout.session.completed',
      'checkout.session.completed',
      'payment_intent.succeeded',
    ])
    expect(told[0]?.id).toBe(told[1]?.id)
    await rehearse({ held: false })
    await toldOf(4)
    expect(types().at(-1)).toBe('charge.succeeded')
  })

  it('is not accepted with another secret, another body or an old time', async () => {
    const { signatureOf } = await import('../../scripts/local/payments/courier.mjs')
    const body = JSON.stringify({ id: 'evt_1', object: 'event', type: 'charge.succeeded' })
    const check = (sent: string, signature: string) =>
      Stripe.webhooks.constructEvent(sent, signature, webhookSecret)
    expect(check(body, signatureOf(body, webhookSecret)).type).toBe('charge.succeeded')
    expect(() => check(body, signatureOf(body, 'whsec_other'))).toThrow(/signature/i)
    expect(() => check(body.replace('1', '2'), signatureOf(body, webhookSecret))).toThrow(/signature/i)
    expect(() => check(body, signatureOf(body, webhookSecret, 1_700_000_000))).toThrow(/tolerance/i)
  })

  it('is remembered over a restart, and so is every checkout', async () => {
    await rehearse({ held: true })
    const session = await open()
    await choose(session, 'decline')
    await service.stop()
    service = await start()
    stripe = clientWith(secretKey)
    await toldOf(1)
    expect((await again(session.id)).status).toBe('open')
  })
})

it('a form of another site presses no button, and the list of what happened asks for no key', async () => {
  const session = await open()
  const answer = await fetch(session.url ?? '', {
    method: 'POST',
    headers: { 'sec-fetch-site': 'cross-site' },
    body: new URLSearchParams({ choice: 'pay' }),
  })
  expect(answer.status).toBe(403)
  expect((await again(session.id)).status).toBe('open')
  const page = await (await fetch(`${service.endpoint}/`)).text()
  expect(page).toContain('Deposit, summer dress')
  expect(page).not.toContain(secretKey)
  expect((await fetch(`${service.endpoint}/rehearsal`, { method: 'POST', body: '{}' })).status).toBe(401)
})

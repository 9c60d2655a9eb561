import { seconds } from './books.mjs'
import { wrong } from './errors.mjs'

const hour = 3600

/**
 * Opens a checkout: a page on which a sum is paid once.
 * @param {ReturnType<import('./books.mjs').openBooks>} books
 * @param {ReturnType<import('./form.mjs').reader>} form
 * @param {string} endpoint where the page stands
 */
export function openSession(books, form, endpoint) {
  const mode = form.needed('mode')
  if (mode !== 'payment') throw wrong('mode', 'Of the modes there is payment here.')
  const lines = form.list('line_items').map(readLine)
  if (lines.length === 0)
    throw wrong('line_items', 'Missing required param: line_items.', 'parameter_missing')
  const [{ currency }] = lines
  if (lines.some((line) => line.currency !== currency))
    throw wrong('line_items', 'All lines of one checkout have the same currency.')
  const total = lines.reduce((sum, line) => sum + line.amount_total, 0)
  const now = seconds()
  const intent = form.inner('payment_intent_data')
  const intentData = { description: intent.text('description') ?? null, metadata: intent.metadata() }
  intent.end()
  const asked = {
    success_url: form.address('success_url'),
    cancel_url: form.text('cancel_url') === undefined ? null : form.address('cancel_url'),
    client_reference_id: form.text('client_reference_id', { most: 200 }) ?? null,
    customer_email: form.text('customer_email', { most: 512 }) ?? null,
    locale: form.text('locale') ?? null,
    metadata: form.metadata(),
    expires_at:
      form.whole('expires_at', { least: now + hour / 2, most: now + 24 * hour + 60 }) ?? now + 24 * hour,
  }
  // Cards are all there is here, whatever else would be offered elsewhere.
  form.texts('payment_method_types')
  form.end()
  const session = books.make('cs_test', {
    ...asked,
    amount_subtotal: total,
    amount_total: total,
    currency,
    customer_details: null,
    mode,
    payment_intent: null,
    payment_method_types: ['card'],
    payment_status: 'unpaid',
    status: 'open',
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted_page',
  })
  session.url = `${endpoint}/pay/${session.id}`
  books.kept.lines[session.id] = { lines, intentData }
  return session
}

function readLine(form) {
  const price = form.inner('price_data')
  const product = price.inner('product_data')
  const currency = price.needed('currency').toLowerCase()
  if (!/^[a-z]{3}$/.test(currency))
    throw wrong('line_items', `Invalid currency: ${currency}. It has three letters, such as eur.`)
  const amount = price.whole('unit_amount')
  if (amount === undefined)
    throw wrong('line_items', 'Missing required param: price_data[unit_amount].', 'parameter_missing')
  const quantity = form.whole('quantity', { least: 1 }) ?? 1
  const line = {
    object: 'item',
    description: product.needed('name'),
    note: product.text('description') ?? null,
    currency,
    quantity,
    amount_subtotal: amount * quantity,
    amount_total: amount * quantity,
  }
  for (const each of [product, price, form]) each.end()
  return line
}

/** Ends an open checkout before it is paid. @throws {ApiError} when it is not open */
export function expireSession(books, session, emit) {
  if (session.status !== 'open')
    throw wrong(
      undefined,
      `Only Checkout Sessions with a status in ["open"] can be expired. This one is ${session.status}.`,
    )
  Object.assign(session, { status: 'expired', url: null })
  emit('checkout.session.expired', session)
}

/** Ends what nobody has paid in time. */
export function expireOverdue(books, emit) {
  const overdue = books
    .things('checkout.session')
    .filter(({ status, expires_at: end }) => status === 'open' && end <= seconds())
  for (const session of overdue) expireSession(books, session, emit)
  return overdue.length > 0
}

/** The intent of a checkout, made when a card is first tried. */
function intentOf(books, session) {
  if (session.payment_intent) return books.find('pi', session.payment_intent)
  const { intentData } = books.kept.lines[session.id]
  const intent = books.make('pi', {
    ...intentData,
    amount: session.amount_total,
    amount_received: 0,
    capture_method: 'automatic',
    client_secret: null,
    currency: session.currency,
    last_payment_error: null,
    latest_charge: null,
    payment_method_types: ['card'],
    receipt_email: session.customer_email,
    status: 'requires_payment_method',
  })
  session.payment_intent = intent.id
  return intent
}

/** What happens when the person pays. A checkout is paid once, however often the button is pressed. */
export function pay(books, session, emit) {
  if (session.status !== 'open') return
  const intent = intentOf(books, session)
  const charge = books.make('ch', {
    amount: intent.amount,
    amount_captured: intent.amount,
    amount_refunded: 0,
    captured: true,
    currency: intent.currency,
    metadata: intent.metadata,
    paid: true,
    payment_intent: intent.id,
    payment_method_details: { type: 'card', card: { brand: 'visa', last4: '4242' } },
    refunded: false,
    status: 'succeeded',
  })
  Object.assign(intent, {
    amount_received: intent.amount,
    last_payment_error: null,
    latest_charge: charge.id,
    status: 'succeeded',
  })
  Object.assign(session, {
    customer_details: { email: session.customer_email, name: null },
    payment_status: 'paid',
    status: 'complete',
    url: null,
  })
  emit('charge.succeeded', charge)
  emit('payment_intent.succeeded', intent)
  emit('checkout.session.completed', session)
}

/** What happens when the bank says no: the checkout stays open for another try. */
export function decline(books, session, emit) {
  if (session.status !== 'open') return
  const intent = intentOf(books, session)
  intent.last_payment_error = {
    type: 'card_error',
    code: 'card_declined',
    decline_code: 'generic_decline',
    message: 'Your card was declined.',
  }
  emit('payment_intent.payment_failed', intent)
}

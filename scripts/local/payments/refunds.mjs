import { ApiError, wrong } from './errors.mjs'

const reasons = ['duplicate', 'fraudulent', 'requested_by_customer']

/**
 * Gives money back, all that is left of a payment or a part of it.
 * @param {ReturnType<import('./books.mjs').openBooks>} books
 * @param {ReturnType<import('./form.mjs').reader>} form
 * @param {(type: string, thing: object) => void} emit
 */
export function refund(books, form, emit) {
  const intent = books.find('pi', form.needed('payment_intent'), 'payment_intent')
  const asked = form.whole('amount', { least: 1 })
  const reason = form.text('reason') ?? null
  const metadata = form.metadata()
  form.end()
  if (reason !== null && !reasons.includes(reason))
    throw wrong('reason', `Invalid reason: must be one of ${reasons.join(', ')}`)
  if (!intent.latest_charge)
    throw new ApiError(400, {
      code: 'payment_intent_unexpected_state',
      message: `This PaymentIntent (${intent.id}) does not have a successful charge to refund.`,
    })
  const charge = books.find('ch', intent.latest_charge)
  const left = charge.amount - charge.amount_refunded
  if (left === 0)
    throw new ApiError(400, {
      code: 'charge_already_refunded',
      message: `Charge ${charge.id} has already been refunded.`,
    })
  const amount = asked ?? left
  if (amount > left)
    throw wrong('amount', `Refund amount (${amount}) is greater than unrefunded amount on charge (${left})`)
  charge.amount_refunded += amount
  charge.refunded = charge.amount_refunded === charge.amount
  const given = books.make('re', {
    amount,
    charge: charge.id,
    currency: charge.currency,
    metadata,
    payment_intent: intent.id,
    reason,
    status: 'succeeded',
  })
  emit('refund.created', given)
  emit('charge.refunded', charge)
  return given
}

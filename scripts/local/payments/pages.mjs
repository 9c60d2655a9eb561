import { localPage, plain } from '../page.mjs'

/** Money in the units that people say, from the smallest unit of its currency. */
export function money(amount, currency) {
  const format = new Intl.NumberFormat('en-GB', { style: 'currency', currency })
  return format.format(amount / 10 ** format.resolvedOptions().maximumFractionDigits)
}

const practice =
  '<p class="note">This stands in for the page of a card-payment service, on this machine only. No card is asked for and no money moves.</p>'

const linesOf = (lines) =>
  `<table><tbody>${lines
    .map(
      ({ description, note, quantity, amount_total: total, currency }) =>
        `<tr><td>${quantity > 1 ? `${quantity} × ` : ''}${plain(description)}${note ? `<br><small>${plain(note)}</small>` : ''}</td><td class="figure">${plain(money(total, currency))}</td></tr>`,
    )
    .join('')}</tbody></table>`

/**
 * The page on which a checkout is paid or declined.
 * @param {object} session
 * @param {object[]} lines
 * @param {boolean} declined the last try was
 */
export function payPage(session, lines, declined) {
  const said = declined
    ? '<p class="told" role="alert">The card was declined. Nothing was paid; try again.</p>'
    : ''
  const back = session.cancel_url ? `<a href="${plain(session.cancel_url)}">Go back without paying</a>` : ''
  return localPage(
    'Practice payment',
    `${practice}${said}<p class="sum">${plain(money(session.amount_total, session.currency))}</p>${linesOf(lines)}
<form method="post"><div class="row"><button class="main" name="choice" value="pay">Pay ${plain(money(session.amount_total, session.currency))}</button><button name="choice" value="decline">Decline the card</button>${back}</div></form>`,
  )
}

/** What stands there when there is nothing to pay any more. */
export function closedPage(session) {
  const words =
    session.status === 'complete'
      ? 'This is paid already. Nothing is taken a second time.'
      : 'This page can be paid on no more. Go back and ask for a new one.'
  const to = session.status === 'complete' ? session.success_url : session.cancel_url
  return localPage(
    'Practice payment',
    `${practice}<p>${words}</p>${to ? `<p><a href="${plain(addressFor(session, to))}">Go back</a></p>` : ''}`,
  )
}

/** Where the person goes afterwards: the service puts the checkout's id in for its place-holder. */
export const addressFor = ({ id }, address) => address.replaceAll('{CHECKOUT_SESSION_ID}', id)

const states = {
  open: 'waiting to be paid',
  complete: 'paid',
  expired: 'ended unpaid',
}

function stateOf(session, charge) {
  if (!charge?.amount_refunded) return states[session.status]
  return charge.refunded
    ? 'paid and given back'
    : `paid, ${money(charge.amount_refunded, charge.currency)} given back`
}

/** Everything there is: checkouts and what was told about them. Newest first. */
export function overviewPage(books) {
  const chargeOf = ({ payment_intent: id }) => books.kept.things[books.kept.things[id]?.latest_charge]
  const sessions = books.things('checkout.session').reverse()
  const rows = sessions.map((session) => {
    const name = plain(books.kept.lines[session.id].lines.map(({ description }) => description).join(', '))
    const title = session.status === 'open' ? `<a href="/pay/${session.id}">${name}</a>` : name
    return `<tr><td>${title}</td><td>${plain(stateOf(session, chargeOf(session)))}</td><td class="figure">${plain(money(session.amount_total, session.currency))}</td></tr>`
  })
  const told = [...books.kept.deliveries].reverse().map(({ event, tries, taken, status }) => {
    const { type } = books.kept.things[event]
    const answer = taken ? 'taken' : tries === 0 ? 'not sent yet' : `answered with ${status || 'nothing'}`
    return `<tr><td>${plain(type).replace(/[._]/g, '$&<wbr>')}</td><td>${answer}${tries > 1 ? `, sent ${tries} times` : ''}</td><td class="figure"><form method="post" action="/events/${event}"><button class="small">Send again</button></form></td></tr>`
  })
  return localPage(
    'Local payments',
    `${practice}${rows.length > 0 ? `<h2>Checkouts</h2><table><tbody>${rows.join('')}</tbody></table>` : '<p>Nothing has been asked for yet.</p>'}
${told.length > 0 ? `<h2>Told to Chalkfold</h2><table><tbody>${told.join('')}</tbody></table>` : ''}`,
  )
}

import { localPage, plain } from '../page.mjs'

/** Addresses in a text turned into links, everything else made harmless. */
function linked(text) {
  return text
    .split(/(https?:\/\/[^\s<>"]+)/)
    .map((part, index) => (index % 2 ? `<a href="${plain(part)}">${plain(part)}</a>` : plain(part)))
    .join('')
}

/**
 * The mailbox as a page. Only the text part is shown: a message cannot bring markup of its own.
 * @param {import('./mailbox.mjs').Message[]} messages newest first
 */
export function mailPage(messages) {
  const articles = messages.map(
    ({ id, from, to, subject, date, text }) => `
  <article id="${plain(id)}">
    <h2>${plain(subject || '(no subject)')}</h2>
    <dl><dt>To</dt><dd>${plain(to.join(', '))}</dd><dt>From</dt><dd>${plain(from)}</dd><dt>At</dt><dd><time datetime="${plain(date)}">${plain(date)}</time></dd></dl>
    <pre>${linked(text)}</pre>
  </article>`,
  )
  return localPage(
    'Local mailbox',
    `<p class="note">Mail that Chalkfold sent on this machine. Nothing here has left it. Newest first; load the page again for what has come since.</p>
${articles.join('') || '<p>No message yet. Invite somebody, or ask for a new password, and the message appears here.</p>'}`,
  )
}

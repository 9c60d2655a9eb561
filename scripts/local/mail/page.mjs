/** Text made harmless for a page. */
function plain(text) {
  return text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)
}

/** Addresses in a text turned into links, everything else made harmless. */
function linked(text) {
  return text
    .split(/(https?:\/\/[^\s<>"]+)/)
    .map((part, index) => (index % 2 ? `<a href="${plain(part)}">${plain(part)}</a>` : plain(part)))
    .join('')
}

const style = `
  :root { color-scheme: light dark; --ground: #f6f3ec; --sheet: #fffdf8; --ink: #2a2723; --soft: #6b6257; --rule: #d9d2c3; --link: #2f4a7c }
  @media (prefers-color-scheme: dark) { :root { --ground: #211f1d; --sheet: #2b2825; --ink: #f2ede2; --soft: #b8ae9e; --rule: #46413a; --link: #a9bfea } }
  body { margin: 0 auto; max-width: 46rem; padding: 2rem 1rem; background: var(--ground); color: var(--ink); font: 1rem/1.5 'Source Sans 3', system-ui, sans-serif }
  h1 { font-size: 1.4rem; margin: 0 } h2 { font-size: 1.1rem; margin: 0 0 .25rem }
  p.note, dl { color: var(--soft); margin: .25rem 0 1rem } dl { display: grid; grid-template-columns: max-content 1fr; gap: 0 .75rem } dd { margin: 0 }
  article { background: var(--sheet); border: 1px solid var(--rule); padding: 1rem 1.25rem; margin-block: 1rem }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; margin: 0 } a { color: var(--link) }`

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
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>Local mailbox – Chalkfold</title><style>${style}</style></head>
<body><main><h1>Local mailbox</h1>
<p class="note">Mail that Chalkfold sent on this machine. Nothing here has left it. Newest first; load the page again for what has come since.</p>
${articles.join('') || '<p>No message yet. Invite somebody, or ask for a new password, and the message appears here.</p>'}
</main></body></html>`
}

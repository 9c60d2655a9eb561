/** Text made harmless for a page. */
export function plain(text) {
  return String(text).replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)
}

const style = `
  :root { color-scheme: light dark; --ground: #f6f3ec; --sheet: #fffdf8; --ink: #2a2723; --soft: #6b6257; --rule: #d9d2c3; --link: #2f4a7c; --on-link: #fffdf8 }
  @media (prefers-color-scheme: dark) { :root { --ground: #211f1d; --sheet: #2b2825; --ink: #f2ede2; --soft: #b8ae9e; --rule: #46413a; --link: #a9bfea; --on-link: #1b1a19 } }
  body { margin: 0 auto; max-width: 46rem; padding: 2rem 1rem; background: var(--ground); color: var(--ink); font: 1rem/1.5 'Source Sans 3', system-ui, sans-serif }
  h1 { font-size: 1.4rem; margin: 0 } h2 { font-size: 1.1rem; margin: 0 0 .25rem } table + h2 { margin-top: 2rem }
  p.note, dl { color: var(--soft); margin: .25rem 0 1rem } dl { display: grid; grid-template-columns: max-content 1fr; gap: 0 .75rem } dd { margin: 0 }
  article { background: var(--sheet); border: 1px solid var(--rule); padding: 1rem 1.25rem; margin-block: 1rem }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; margin: 0 } a { color: var(--link) }
  table { border-collapse: collapse; width: 100%; font-variant-numeric: tabular-nums } th, td { text-align: left; vertical-align: baseline; padding: .4rem .75rem .4rem 0; border-bottom: 1px solid var(--rule); overflow-wrap: anywhere } .figure { text-align: right; padding-right: 0; white-space: nowrap }
  form { display: inline } button { font: inherit; font-weight: 600; min-height: 2.75rem; padding: 0 1.25rem; border: 1px solid var(--rule); border-radius: 4px; background: var(--sheet); color: var(--ink); cursor: pointer }
  button.main { background: var(--link); border-color: var(--link); color: var(--on-link) } button.small { min-height: 2rem; padding: 0 .75rem }
  .row { display: flex; flex-wrap: wrap; gap: .75rem; align-items: center; margin-top: 1.25rem } .sum { font-size: 2rem; margin: .5rem 0 } .told { border-left: 4px solid var(--link); padding-left: .75rem }`

/** A page of one of the local services, in one look. */
export function localPage(title, inner) {
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${plain(title)} – Chalkfold</title><style>${style}</style></head>
<body><main><h1>${plain(title)}</h1>
${inner}
</main></body></html>`
}

/**
 * Headers of such a page: it needs nothing but its own style sheet.
 * @param {string} [forms] where its forms may lead, besides back to itself
 */
export function pageHeaders(forms = '') {
  return {
    'content-type': 'text/html; charset=utf-8',
    'cache-control': 'no-store',
    'content-security-policy': `default-src 'none'; style-src 'unsafe-inline'; form-action 'self' ${forms}; base-uri 'none'; frame-ancestors 'none'`,
    'x-content-type-options': 'nosniff',
  }
}

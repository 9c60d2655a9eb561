/** A letter in plain words: paragraphs, at most one link, and why it came. */
export interface Letter {
  readonly to: string
  readonly subject: string
  readonly greeting: string
  readonly paragraphs: readonly string[]
  readonly link?: { readonly words: string; readonly url: string }
  readonly reason: string
}

const escapes: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

/** Text as it may stand in HTML: names with markup are inert. */
function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (letter) => escapes[letter] ?? letter)
}

/** The text part. */
export function letterText({ greeting, paragraphs, link, reason }: Letter): string {
  const linked = link ? [`${link.words}:\n${link.url}`] : []
  return [greeting, ...paragraphs, ...linked, `Chalkfold\n${reason}`].join('\n\n') + '\n'
}

/** The HTML part: the same words, readable in both light and dark mail programs. */
export function letterHtml({ subject, greeting, paragraphs, link, reason }: Letter): string {
  const paragraph = (html: string) => `<p style="margin:0 0 16px">${html}</p>`
  const linked = link
    ? paragraph(
        `<a href="${escaped(link.url)}" style="color:#2c3a78;font-weight:600">${escaped(link.words)}</a><br>` +
          `<span style="font-size:14px;word-break:break-all">${escaped(link.url)}</span>`,
      )
    : ''
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><title>${escaped(subject)}</title></head>
<body style="margin:0;padding:24px;background:#f7f4ec;color:#1b2140;font:16px/1.5 'Source Sans 3',system-ui,sans-serif">
<div style="max-width:560px;margin:0 auto">
${[greeting, ...paragraphs].map((text) => paragraph(escaped(text))).join('\n')}
${linked}
<p style="margin:24px 0 0;padding-top:12px;border-top:1px solid #8f846f;font-size:14px;color:#5f5446">Chalkfold<br>${escaped(reason)}</p>
</div></body></html>
`
}

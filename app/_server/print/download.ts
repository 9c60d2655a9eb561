import 'server-only'

/** What may stand in a file's name everywhere. */
function plainName(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\w]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .toLowerCase()
  return plain || 'pattern'
}

/**
 * A file to be saved under a name made from `parts` ('Blue dress', 'A4' → blue-dress-a4.pdf), kept by no cache.
 * The drafter's own letters stand beside it for browsers that can.
 */
export function download(
  body: string | Uint8Array<ArrayBuffer>,
  type: 'application/pdf' | 'image/svg+xml',
  parts: readonly string[],
): Response {
  const ending = type === 'application/pdf' ? 'pdf' : 'svg'
  const own = encodeURIComponent(`${parts.join(' ').replace(/[/\\]/g, ' ')}.${ending}`).replace(
    /['()*]/g,
    (mark) => `%${mark.charCodeAt(0).toString(16).toUpperCase()}`,
  )
  return new Response(body, {
    headers: {
      'content-type': type,
      'content-disposition': `attachment; filename="${plainName(parts.join(' '))}.${ending}"; filename*=UTF-8''${own}`,
      'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'; sandbox",
      'cache-control': 'private, no-store',
      'x-content-type-options': 'nosniff',
    },
  })
}

import { randomUUID } from 'node:crypto'

/** Text made harmless for XML; what XML cannot hold at all becomes a question mark. */
const plain = (text) =>
  String(text)
    .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '?')
    .replace(/[&<>"'\r]/g, (sign) => `&#${sign.charCodeAt(0)};`)

const document = (name, inner) =>
  `<?xml version="1.0" encoding="UTF-8"?>\n<${name} xmlns="http://s3.amazonaws.com/doc/2006-03-01/">${inner}</${name}>`

/** An error as the protocol writes it. */
export function errorXml({ code, message }, resource) {
  return `<?xml version="1.0" encoding="UTF-8"?>\n<Error><Code>${plain(code)}</Code><Message>${plain(message)}</Message><Resource>${plain(resource)}</Resource><RequestId>${randomUUID()}</RequestId></Error>`
}

/**
 * A page of a list of objects.
 * @param {object} list
 * @param {string} list.bucket
 * @param {string} list.prefix
 * @param {number} list.most
 * @param {import('./store.mjs').Kept[]} list.page
 * @param {string | undefined} list.next where the next page goes on
 */
export function listXml({ bucket, prefix, most, page, next }) {
  const contents = page.map(
    ({ key, size, etag, modified }) =>
      `<Contents><Key>${plain(key)}</Key><LastModified>${modified}</LastModified><ETag>&quot;${etag}&quot;</ETag><Size>${size}</Size><StorageClass>STANDARD</StorageClass></Contents>`,
  )
  return document(
    'ListBucketResult',
    `<Name>${plain(bucket)}</Name><Prefix>${plain(prefix)}</Prefix><KeyCount>${page.length}</KeyCount><MaxKeys>${most}</MaxKeys><IsTruncated>${next !== undefined}</IsTruncated>${next === undefined ? '' : `<NextContinuationToken>${plain(next)}</NextContinuationToken>`}${contents.join('')}`,
  )
}

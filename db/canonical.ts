import { createHash } from 'node:crypto'

/** JSON with the keys of every object in order, so that equal data has equal text. */
function canonical(value: unknown): string {
  return JSON.stringify(value, (_key, inner: unknown) =>
    inner !== null && typeof inner === 'object' && !Array.isArray(inner)
      ? Object.fromEntries(Object.entries(inner).sort(([a], [b]) => (a < b ? -1 : 1)))
      : inner,
  )
}

/** SHA-256 of data as 64 hex digits, whatever the order of its keys. */
export function contentHash(value: unknown): string {
  return createHash('sha256').update(canonical(value)).digest('hex')
}

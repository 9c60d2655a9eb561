import { notFound } from '../access-error'
import { idShape } from '../shapes/ids'

/** The id, when it is one at all. @throws AccessError not-found: what cannot exist is answered like what does not. */
export function knownId(id: unknown, what: string): string {
  const result = idShape.safeParse(id)
  if (!result.success) throw notFound(what)
  return result.data
}

import 'server-only'
import { AccessError } from '@/db/access-error'
import { type SignedIn, signedInBy } from '@/db/access/sessions'
import type { Actor } from '@/db/permissions'
import { sessionIdIn } from './session-id'

function cookiesOf(request: Request) {
  const pairs = (request.headers.get('cookie') ?? '').split(';').map((pair) => pair.trim())
  return pairs.flatMap((pair) => {
    const at = pair.indexOf('=')
    return at < 1 ? [] : [{ name: pair.slice(0, at), value: pair.slice(at + 1) }]
  })
}

/** @throws AccessError not-signed-in */
export function requireSession(signedIn: SignedIn | null): SignedIn {
  if (signedIn) return signedIn
  throw new AccessError('not-signed-in', 'You are signed out. Sign in again; what you typed is kept.')
}

/** @throws AccessError not-signed-in, forbidden */
export function requireMember(signedIn: SignedIn | null): Actor {
  const { actor } = requireSession(signedIn)
  if (actor) return actor
  throw new AccessError('forbidden', 'You are no longer a member of this workroom. Choose another one.')
}

/** Who sent a request, for route handlers. @throws AccessError not-signed-in, forbidden */
export async function actorForRequest(request: Request): Promise<Actor> {
  const cookies = cookiesOf(request)
  const sessionId = await sessionIdIn({ getAll: () => cookies })
  return requireMember(sessionId === null ? null : await signedInBy(sessionId))
}

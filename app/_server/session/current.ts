import 'server-only'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'
import { cache } from 'react'
import { type SignedIn, signedInBy } from '@/db/access/sessions'
import type { Actor } from '@/db/permissions'
import { sessionIdIn } from './session-id'

/** Who is signed in, read from the database once a request. */
export const currentSession = cache(async (): Promise<SignedIn | null> => {
  const sessionId = await sessionIdIn(await cookies())
  return sessionId === null ? null : signedInBy(sessionId)
})

/**
 * For pages of any signed-in person, in a workroom or not. Otherwise goes to the sign-in page.
 * @param path of the page, to come back to
 */
export async function requireSignedIn(path?: string): Promise<SignedIn> {
  const signedIn = await currentSession()
  if (signedIn) return signedIn
  return redirect(path === undefined ? '/sign-in' : `/sign-in?callbackUrl=${encodeURIComponent(path)}`)
}

/**
 * For pages of a workroom. Goes to the sign-in page, or to the choice of workrooms when the person is in none.
 * @param path of the page, to come back to
 */
export async function requireActor(path?: string): Promise<Actor> {
  const { actor } = await requireSignedIn(path)
  return actor ?? redirect('/workrooms')
}

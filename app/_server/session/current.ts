import 'server-only'
import { cookies, headers } from 'next/headers'
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

/** The page that is asked for, as proxy.ts notes it; another page's name would only lead back to that page. */
async function askedPage(): Promise<string | null> {
  return (await headers()).get('x-page')
}

/**
 * For pages of any signed-in person, in a workroom or not. Otherwise goes to the sign-in page, and from there back.
 * @param path of the page, when it is not the one that was asked for
 */
export async function requireSignedIn(path?: string): Promise<SignedIn> {
  const signedIn = await currentSession()
  if (signedIn) return signedIn
  const back = path ?? (await askedPage())
  return redirect(back === null ? '/sign-in' : `/sign-in?callbackUrl=${encodeURIComponent(back)}`)
}

/**
 * For pages of a workroom. Goes to the sign-in page, or to the choice of workrooms when the person is in none.
 * @param path of the page, when it is not the one that was asked for
 */
export async function requireActor(path?: string): Promise<Actor> {
  const { actor } = await requireSignedIn(path)
  return actor ?? redirect('/workrooms')
}

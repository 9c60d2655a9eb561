import 'server-only'
import { getToken } from 'next-auth/jwt'
import type { NextRequest } from 'next/server'
import { appOrigin } from '../config'

interface ReadableCookies {
  getAll(): readonly { readonly name: string; readonly value: string }[]
}

/** Whether the session cookie is for https only, and so carries the prefix that browsers enforce. */
const secure = () => appOrigin().startsWith('https://')

export const sessionCookieName = () => `${secure() ? '__Secure-' : ''}next-auth.session-token`

/** The session id in the cookies, or null when there is none or it was not made here. The row may have ended. */
export async function sessionIdIn(cookies: ReadableCookies): Promise<string | null> {
  // The cookie alone counts: next-auth would otherwise accept a bearer token as well.
  const request = { cookies, headers: {} } as unknown as NextRequest
  const token = await getToken({ req: request, cookieName: sessionCookieName(), secureCookie: secure() })
  return token?.sessionId ?? null
}

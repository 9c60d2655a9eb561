import 'server-only'
import { encode } from 'next-auth/jwt'
import { cookies } from 'next/headers'
import { sessionCookieName } from './session-id'

/** Seconds a session cookie lives, in next-auth's sign-in as in what is set here; the session's row may end sooner. */
export const cookieAge = 60 * 24 * 3600

/** Puts this session into the browser's cookie, just as signing in does. For server actions and route handlers. */
export async function keepSession(sessionId: string): Promise<void> {
  const name = sessionCookieName()
  const value = await encode({
    token: { sessionId },
    secret: process.env.NEXTAUTH_SECRET ?? '',
    maxAge: cookieAge,
  })
  const jar = await cookies()
  jar.set(name, value, {
    httpOnly: true,
    sameSite: 'lax',
    path: '/',
    secure: name.startsWith('__Secure-'),
    maxAge: cookieAge,
  })
}

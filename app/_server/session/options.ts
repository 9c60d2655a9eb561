import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'
import { signIn } from '@/db/access/sign-in'
import { AccessError } from '@/db/access-error'
import { requestAddress } from '../address'
import { appOrigin } from '../config'
import { log } from '../log'
import { refusalOf } from '../problems'
import { deviceWords } from './device-words'
import { safePath } from './safe-path'
import { cookieAge } from './session-cookie'

/** Next-auth reports only an error's message: the status is what the sign-in page turns into words. */
function refusedSignIn(error: unknown): Error {
  const { status } = refusalOf(error)
  const code = error instanceof AccessError ? error.code : 'unavailable'
  log.warn({ status }, 'sign-in refused')
  return new Error(code)
}

/**
 * Sign-in by e-mail address and password. The cookie is an encrypted token that holds nothing but the id of a session
 * row; the row is what counts, and it is read on every request.
 */
export function authOptions(): NextAuthOptions {
  process.env.NEXTAUTH_URL = appOrigin()
  return {
    secret: process.env.NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: cookieAge },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(credentials, request) {
          const headers = new Headers(request.headers as Record<string, string>)
          const address = requestAddress(headers)
          const device = deviceWords(headers.get('user-agent'))
          const { email, password } = credentials ?? { email: '', password: '' }
          try {
            const { userId, sessionId } = await signIn({ email, password }, address, device)
            log.info({ userId, sessionId }, 'signed in')
            return { id: userId, sessionId }
          } catch (error) {
            throw refusedSignIn(error)
          }
        },
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { sessionId: user.sessionId } : token),
      redirect: ({ url }) =>
        `${appOrigin()}${safePath(url.startsWith(`${appOrigin()}/`) ? url.slice(appOrigin().length) : url)}`,
    },
  }
}

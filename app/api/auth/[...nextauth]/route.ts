import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'
import { authOptions } from '@/app/_server/session/options'
import { requireSameOrigin } from '@/app/_server/origin'
import { refused } from '@/app/_server/session/workroom-route'
import { notFound } from '@/db/access-error'

interface Context {
  readonly params: Promise<{ readonly nextauth: readonly string[] }>
}

/** Only what signing in needs: reading or renewing a session through here would go round the session row. */
const offered = new Set(['GET csrf', 'GET providers', 'POST callback/credentials'])

async function handle(request: NextRequest, context: Context): Promise<Response> {
  try {
    const { nextauth } = await context.params
    if (!offered.has(`${request.method} ${nextauth.join('/')}`)) throw notFound('page')
    if (request.method === 'POST') requireSameOrigin(request.headers)
    const response = (await NextAuth(request, context as never, authOptions())) as Response
    response.headers.set('cache-control', 'private, no-store')
    return response
  } catch (error) {
    return refused(error)
  }
}

export { handle as GET, handle as POST }

import 'server-only'
import * as z from 'zod'
import { notFound } from '@/db/access-error'
import { takeTry } from '@/db/access/limits'
import { openShare } from '@/db/access/shares'
import type { OpenedShare } from '@/db/access/shares'
import { checkInput } from '@/db/check-input'
import { requestAddress } from '../address'
import { refused } from '../session/workroom-route'

type Handler = (
  request: Request,
  context: { readonly params: Promise<{ readonly token: string }> },
) => Promise<Response>

/**
 * A route handler for whoever holds a link. Guesses are counted by address; what a link opens, the database decides.
 * @param shape of the query
 * @param fn returns a Response as it is to be sent, or data to be sent as `{ok: true, value}`
 */
export function sharedRoute<S extends z.ZodRawShape, T>(
  shape: S,
  fn: (share: OpenedShare, input: z.output<z.ZodObject<S>>) => Promise<T | Response> | T | Response,
): Handler {
  const schema = z.strictObject(shape)
  return async (request, { params }) => {
    try {
      const share = await openShare((await params).token)
      if (!share) {
        await takeTry('token address', requestAddress(request.headers))
        throw notFound('link')
      }
      const query = Object.fromEntries(new URL(request.url).searchParams)
      const result = await fn(share, checkInput(schema, query))
      const response = result instanceof Response ? result : Response.json({ ok: true, value: result })
      response.headers.set('cache-control', 'private, no-store')
      response.headers.set('referrer-policy', 'no-referrer')
      response.headers.set('x-robots-tag', 'noindex, nofollow')
      return response
    } catch (error) {
      return refused(error)
    }
  }
}

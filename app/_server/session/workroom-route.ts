import 'server-only'
import type * as z from 'zod'
import { checkInput } from '@/db/check-input'
import type { Actor } from '@/db/permissions'
import { requireSameOrigin } from '../origin'
import { type Asking, refusalOf } from '../problems'
import { jsonBody } from './json-body'
import { actorForRequest } from './request'

type Params = Readonly<Record<string, string | string[] | undefined>>
type Handler = (request: Request, context: { readonly params: Promise<Params> }) => Promise<Response>

const unchanging = new Set(['GET', 'HEAD'])

/** A private answer: no cache may keep it. */
function privately(response: Response): Response {
  response.headers.set('cache-control', 'private, no-store')
  return response
}

async function inputOf(request: Request, params: Params): Promise<Record<string, unknown>> {
  const sent = unchanging.has(request.method)
    ? Object.fromEntries(new URL(request.url).searchParams)
    : request.body === null
      ? {}
      : await jsonBody(request)
  return { ...sent, ...params }
}

/** Answers an error as JSON: `{ok: false, problems: [{field, message}]}`. */
export function refused(error: unknown, asking: Asking = {}): Response {
  const { status, problems } = refusalOf(error, asking)
  return privately(Response.json({ ok: false, problems }, { status }))
}

/**
 * A route handler inside a workroom: origin (for changes), session, membership and input are checked before `fn` runs.
 * The input is the query (GET) or the JSON body, with the address's own parameters on top.
 * @param fn returns a Response as it is to be sent, or data to be sent as `{ok: true, value}`
 */
export function workroomRoute<S extends z.ZodType, T>(
  schema: S,
  fn: (actor: Actor, input: z.output<S>, request: Request) => Promise<T | Response>,
): Handler {
  return async (request, { params }) => {
    let userId: string | undefined
    try {
      if (!unchanging.has(request.method)) requireSameOrigin(request.headers)
      const actor = await actorForRequest(request)
      userId = actor.userId
      const result = await fn(actor, checkInput(schema, await inputOf(request, await params)), request)
      return privately(result instanceof Response ? result : Response.json({ ok: true, value: result }))
    } catch (error) {
      return refused(error, { userId, request: `${request.method} ${new URL(request.url).pathname}` })
    }
  }
}

import 'server-only'
import { unstable_rethrow } from 'next/navigation'
import { headers } from 'next/headers'
import type * as z from 'zod'
import type { FieldProblem } from '@/db/access-error'
import type { SignedIn } from '@/db/access/sessions'
import { checkInput } from '@/db/check-input'
import type { Actor } from '@/db/permissions'
import { requestAddress } from '../address'
import { requireSameOrigin } from '../origin'
import { refusalOf } from '../problems'
import { currentSession } from './current'
import { requireMember, requireSession } from './request'

/** What a server action answers: a value, or what is wrong field by field. It never throws. */
export type ActionResult<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly FieldProblem[] }

type Action<S extends z.ZodType, T> = (input: z.input<S> | FormData) => Promise<ActionResult<T>>

/** The fields of a form; one that stands there several times becomes a list. */
function fieldsOf(form: FormData): Record<string, unknown> {
  const names = [...new Set(form.keys())].filter((name) => !name.startsWith('$ACTION'))
  return Object.fromEntries(
    names.map((name) => {
      const values = form.getAll(name)
      return [name, values.length === 1 ? values[0] : values]
    }),
  )
}

/** The page an action was called from, without its query. */
const pageOf = (sent: Headers) => (sent.get('x-page') ?? '').split('?')[0]

/** Origin first, then who it is, then what was sent: nobody learns more than they may. */
async function answer<
  S extends z.ZodType,
  W extends { readonly userId?: string; readonly address?: string },
  T,
>(
  schema: S,
  input: unknown,
  identify: (sent: Headers) => W | Promise<W>,
  fn: (caller: W, input: z.output<S>) => Promise<T>,
): Promise<ActionResult<T>> {
  const sent = await headers()
  let userId: string | undefined
  try {
    requireSameOrigin(sent)
    const caller = await identify(sent)
    userId = caller.userId
    const checked = checkInput(schema, input instanceof FormData ? fieldsOf(input) : input)
    return { ok: true, value: await fn(caller, checked) }
  } catch (error) {
    unstable_rethrow(error)
    return {
      ok: false,
      problems: refusalOf(error, { userId, request: `action on ${pageOf(sent)}` }).problems,
    }
  }
}

/**
 * A server action for anybody: origin and input are checked.
 * @param fn also gets the address the request came from, for the limits
 */
export function publicAction<S extends z.ZodType, T>(
  schema: S,
  fn: (input: z.output<S>, address: string) => Promise<T>,
): Action<S, T> {
  return async (input) =>
    answer(
      schema,
      input,
      (sent) => ({ address: requestAddress(sent) }),
      ({ address }, checked) => fn(checked, address),
    )
}

/** A server action for whoever is signed in, whether or not in a workroom. */
export function signedInAction<S extends z.ZodType, T>(
  schema: S,
  fn: (signedIn: SignedIn, input: z.output<S>) => Promise<T>,
): Action<S, T> {
  return async (input) => answer(schema, input, async () => requireSession(await currentSession()), fn)
}

/** A server action inside a workroom: origin, session, membership and input are checked before `fn` runs. */
export function workroomAction<S extends z.ZodType, T>(
  schema: S,
  fn: (actor: Actor, input: z.output<S>) => Promise<T>,
): Action<S, T> {
  return async (input) => answer(schema, input, async () => requireMember(await currentSession()), fn)
}

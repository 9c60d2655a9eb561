import 'server-only'
import { ConnectionError, ConnectionAcquireTimeoutError, TimeoutError, DatabaseError } from 'sequelize'
import { AccessError, type FieldProblem } from '@/db/access-error'
import { newId } from '@/db/new-id'
import { DraftingError } from '@/drafting/drafting-error'
import { log } from './log'

export interface Refusal {
  readonly status: number
  readonly problems: readonly FieldProblem[]
}

const unreachable = [ConnectionError, ConnectionAcquireTimeoutError, TimeoutError]

/** Who asked for what, as far as it is known: for the log. Without secrets: the path of a page, never its query. */
export interface Asking {
  readonly userId?: string
  readonly request?: string
}

/**
 * What an error means to the person: its fields, or a reference to look it up by. Raw messages stay in the log, and
 * no input can cause more than a refusal.
 */
export function refusalOf(error: unknown, asking: Asking = {}): Refusal {
  if (error instanceof AccessError) {
    if (error.code === 'forbidden') log.warn({ ...asking, reference: newId() }, 'denied')
    return { status: error.status, problems: error.problems }
  }
  if (error instanceof DraftingError)
    return { status: 422, problems: error.problems.map(({ field, message }) => ({ field, message })) }
  const reference = newId()
  const busy = unreachable.some((kind) => error instanceof kind)
  log.error(
    {
      ...asking,
      reference,
      // A statement holds what was typed, so only its error number is written down.
      error: error instanceof DatabaseError ? { code: (error.original as { code?: string }).code } : error,
    },
    busy ? 'database unreachable' : 'unexpected error',
  )
  const message = busy
    ? 'The workroom cannot be reached at the moment. Nothing is lost: try again in a minute.'
    : `Something went wrong on our side. Try again; if it stays, tell us the reference ${reference}.`
  return { status: 503, problems: [{ field: '', message }] }
}

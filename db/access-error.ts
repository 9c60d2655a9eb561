/** What is wrong in one field, in words for the person who typed it. An empty field name means the whole request. */
export interface FieldProblem {
  readonly field: string
  readonly message: string
}

const statuses = {
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  invalid: 422,
  limited: 429,
  unavailable: 503,
} as const

export type AccessErrorCode = keyof typeof statuses

/** The database layer's one error: a code, the HTTP status that goes with it, and what to tell the person. */
export class AccessError extends Error {
  readonly code: AccessErrorCode
  readonly status: number
  readonly problems: readonly FieldProblem[]

  /** @param message shown to the person as it stands: no ids, no SQL, nothing about other people's data. */
  constructor(code: AccessErrorCode, message: string, problems?: readonly FieldProblem[]) {
    super(message)
    this.name = 'AccessError'
    this.code = code
    this.status = statuses[code]
    this.problems = problems ?? [{ field: '', message }]
  }
}

/** The same answer for what does not exist and for what belongs to somebody else. */
export function notFound(what: string): AccessError {
  return new AccessError('not-found', `This ${what} does not exist, or you have no access to it.`)
}

/** @param field dotted path of the field at fault. */
export function invalid(field: string, message: string): AccessError {
  return new AccessError('invalid', message, [{ field, message }])
}

import type { Problem } from '../contract'

/** A fault in a formula at a position of its text; whoever knows the field turns it into a Problem. */
export class FormulaFault extends Error {
  constructor(
    message: string,
    readonly position: number,
  ) {
    super(message)
  }
}

/** The fault as a problem of one field (a rule's id). */
export function formulaProblem(field: string, message: string, position: number): Problem {
  return { field, code: 'bad-formula', message, position }
}

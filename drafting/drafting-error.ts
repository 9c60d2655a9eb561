import type { DraftingErrorCode, Problem } from './contract'

/** Thrown for an order that cannot be drafted, with every problem found. Never a NaN, never a half-drawn piece. */
export class DraftingError extends Error {
  readonly code: DraftingErrorCode
  readonly problems: readonly Problem[]

  /** @param problems at least one; the first gives the error its code and message. */
  constructor(problems: readonly Problem[]) {
    super(problems.map((problem) => problem.message).join(' '))
    this.name = 'DraftingError'
    this.problems = problems
    this.code = (problems[0]?.code ?? 'impossible-shape') as DraftingErrorCode
  }

  /** Ids of the fields at fault, each once. */
  get fields(): readonly string[] {
    return [...new Set(this.problems.map((problem) => problem.field))]
  }
}

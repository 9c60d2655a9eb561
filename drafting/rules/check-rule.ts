import type { Problem } from '../contract'
import { DraftingError } from '../drafting-error'
import { checkFormulaKinds, type Kinds } from './check-formula-kinds'
import type { Formula, Kind } from './formula'
import { ruleCycles, type Formulas } from './order-rules'
import { parseFormula } from './parse-formula'

export interface RuleSurroundings {
  /** What every measurement, design value and rule measures, by id. */
  readonly kinds: Kinds
  /** The other rules, by id; an older formula of the same rule is replaced. */
  readonly formulas: Formulas
}

function readOrProblems(text: string, id: string): Formula | readonly Problem[] {
  try {
    return parseFormula(text, id)
  } catch (error) {
    if (error instanceof DraftingError) return error.problems
    throw error
  }
}

function isFormula(read: Formula | readonly Problem[]): read is Formula {
  return 'root' in read
}

/**
 * Everything wrong with a new formula for one rule among others: how it is written, unknown names, kinds, circles.
 * @param id of the rule; the problems name it as their field
 * @param wanted what the rule measures
 * @returns empty when the formula is good
 */
export function checkRule(
  id: string,
  text: string,
  wanted: Kind,
  { kinds, formulas }: RuleSurroundings,
): readonly Problem[] {
  const read = readOrProblems(text, id)
  if (!isFormula(read)) return read
  // First of all, so that any circle through this rule is met at it.
  const circles = ruleCycles({ [id]: read, ...formulas, [id]: read }).filter(({ field }) => field === id)
  return [...checkFormulaKinds(read, kinds, wanted, id), ...circles]
}

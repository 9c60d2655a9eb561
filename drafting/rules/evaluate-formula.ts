import { DraftingError } from '../drafting-error'
import { FormulaFault, formulaProblem } from './bad-formula'
import type { Formula, Values } from './formula'

/**
 * Works a formula out.
 * @param values by name: lengths in mm, angles in degrees, shares and counts bare
 * @param field named in the error, usually the rule's id
 * @returns a finite number: mm, degrees or bare, as the formula's kind is
 * @throws DraftingError 'bad-formula' at a division by zero, a missing value or a number out of bounds, with its position
 */
export function evaluateFormula(formula: Formula, values: Values, field = 'formula'): number {
  try {
    return formula.run(values)
  } catch (error) {
    if (error instanceof FormulaFault)
      throw new DraftingError([formulaProblem(field, error.message, error.position)])
    throw error
  }
}

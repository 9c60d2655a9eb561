import type { Problem } from './contract'
import { DraftingError } from './drafting-error'
import { findGarment } from './garments'
import { kindsOf } from './pen/compile'
import { checkRule, parseFormula } from './rules'

/**
 * What is wrong with a formula for one rule of one garment: how it is written, unknown names, kinds, circles.
 *
 * @returns empty when it is good.
 */
export function checkFormula(garment: string, rule: string, formula: string): readonly Problem[] {
  const found = findGarment({ garment })
  const definition = found.definition.rules.find((one) => one.id === rule)
  if (!definition) {
    return [
      {
        field: rule,
        code: 'unknown-field',
        message: `“${String(rule).slice(0, 60)}” is no rule of this garment.`,
      },
    ]
  }
  if (typeof formula !== 'string') {
    return [
      {
        field: rule,
        code: 'bad-formula',
        message: 'A formula is written, such as “bust / 6 + 1.5in”.',
        position: 0,
      },
    ]
  }
  try {
    const formulas = Object.fromEntries(
      found.definition.rules.map((one) => [one.id, parseFormula(one.formula)]),
    )
    return checkRule(rule, formula, definition.kind, { kinds: kindsOf(found), formulas })
  } catch (error) {
    if (error instanceof DraftingError) return error.problems
    throw error
  }
}

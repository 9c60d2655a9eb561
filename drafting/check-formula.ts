import type { DraftOrder, Problem } from './contract'
import { DraftingError } from './drafting-error'
import { findGarment } from './garments'
import { kindsOf } from './pen/compile'
import { checkRule, parseFormula, type Formula } from './rules'
import { rulesInForce } from './rules-in-force'

/**
 * What is wrong with a formula for one rule of one garment: how it is written, unknown names, kinds, circles.
 *
 * @param among the method, the changed rules and the own measurements of the draft that the rule is for.
 * @returns empty when it is good.
 */
export function checkFormula(
  garment: string,
  rule: string,
  formula: string,
  among: Pick<DraftOrder, 'method' | 'rules' | 'ownMeasurements'> = {},
): readonly Problem[] {
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
  const others = rulesInForce({ ...among, garment }).filter(({ id }) => id !== rule)
  const formulas = Object.fromEntries(others.flatMap((one) => readable(one.id, one.formula)))
  const kinds = kindsOf(found, among.ownMeasurements)
  return checkRule(rule, formula, definition.kind, { kinds, formulas })
}

/** A rule beside the one that is looked at; one that cannot be read is a problem of its own, elsewhere. */
function readable(id: string, text: string): [string, Formula][] {
  try {
    return [[id, parseFormula(text, id)]]
  } catch (error) {
    if (error instanceof DraftingError) return []
    throw error
  }
}

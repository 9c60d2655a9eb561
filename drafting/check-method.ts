import type { DraftingMethod, OwnMeasurement, Problem } from './contract'
import { findGarment, garments } from './garments'
import { compileRules } from './pen/compile'

/**
 * Everything wrong with the formulas of a drafting method: garments and rules that do not exist, how a formula is written,
 * unknown names, kinds, circles.
 *
 * @param own the workroom's own measurements, which its formulas may name.
 * @returns problems whose field is 'garments.<garment>.<rule>', with their position; empty when all is good.
 */
export function checkMethodRules(
  rules: DraftingMethod['garments'],
  own: readonly OwnMeasurement[] = [],
): readonly Problem[] {
  return Object.entries(rules).flatMap(([garment, changed]): readonly Problem[] => {
    const at = (field: string): string => `garments.${garment}.${field}`
    if (!garments.some(({ id }) => id === garment))
      return [
        {
          field: `garments.${garment}`,
          code: 'unknown-garment',
          message: `There is no garment “${garment}”.`,
        },
      ]
    const found = findGarment({ garment })
    const unknown = changed
      .filter(({ id }) => !found.definition.rules.some((rule) => rule.id === id))
      .map(({ id }) => ({
        field: at(id),
        code: 'unknown-field',
        message: `“${id}” is no rule of the ${found.definition.name.toLowerCase()}.`,
      }))
    if (unknown.length > 0) return unknown
    const problems: Problem[] = []
    compileRules(found, Object.fromEntries(changed.map(({ id, formula }) => [id, formula])), own, problems)
    return problems.map((problem) => ({ ...problem, field: at(problem.field) }))
  })
}

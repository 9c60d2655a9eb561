import type { DraftOrder, RuleInForce } from './contract'
import { findGarment } from './garments'
import { methodById } from './methods'

/**
 * The rules that a draft works by, in the garment's order: each as the drafter changed it for this draft, else as the
 * method has it, else the garment's own, with its source.
 * @throws DraftingError 'unknown-garment'
 */
export function rulesInForce(
  order: Pick<DraftOrder, 'garment' | 'method' | 'rules'>,
): readonly RuleInForce[] {
  const { definition } = findGarment(order)
  const { method, rules } = order
  const ofMethod = method?.rules ?? (method && methodById(method.id)?.garments[definition.id]) ?? []
  return definition.rules.map((rule): RuleInForce => {
    const own = rules && Object.hasOwn(rules, rule.id) ? rules[rule.id] : undefined
    if (own !== undefined) return { ...rule, formula: own, source: 'changed for this draft', from: 'order' }
    const changed = ofMethod.find(({ id }) => id === rule.id)
    return changed ? { ...rule, ...changed, from: 'method' } : { ...rule, from: 'garment' }
  })
}

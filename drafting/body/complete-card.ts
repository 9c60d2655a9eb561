import { valueOn, type Card } from './card'
import { estimates } from './estimates'

export interface CompletedCard {
  readonly card: Card
  /** The estimate's id by measurement, for those that were missing. */
  readonly estimatedBy: Readonly<Record<string, string>>
}

/**
 * Fills in what was not measured, one estimate from another where need be.
 * @param card mm; it is not changed, and values on it always stand
 * @param wanted measurements to fill in; all that can be estimated by default
 * @returns the filled card; what cannot be estimated (nothing to go by) stays missing
 */
export function completeCard(card: Card, wanted: readonly string[] = Object.keys(estimates)): CompletedCard {
  const filled: Record<string, number> = {}
  for (const id of Object.keys(card)) {
    const value = valueOn(card, id)
    if (value !== undefined) filled[id] = value
  }
  const estimatedBy: Record<string, string> = {}
  const fill = (id: string): boolean => {
    if (Object.hasOwn(filled, id)) return true
    const rule = Object.hasOwn(estimates, id) ? estimates[id] : undefined
    if (!rule || !rule.uses.every(fill)) return false
    filled[id] = rule.estimate(filled)
    estimatedBy[id] = rule.id
    return true
  }
  for (const id of wanted) fill(id)
  return { card: filled, estimatedBy }
}

import { valueOn, type Card } from './card'
import { relations, type Relation } from './relations'

/** A relation that a card does not keep. */
export interface Misfit {
  readonly relation: Relation
  readonly value: number
  readonly low: number
  readonly high: number
}

/** How one relation stands on the card, or undefined when a measurement is missing. */
export function relationOn(card: Card, relation: Relation): Misfit | undefined {
  const value = valueOn(card, relation.judged)
  if (value === undefined) return undefined
  const others: number[] = []
  for (const id of relation.by) {
    const other = valueOn(card, id)
    if (other === undefined) return undefined
    others.push(other)
  }
  const [low, high] = relation.bounds(...others)
  return { relation, value, low, high }
}

/** A hundredth of a millimetre of grace, for values that stand exactly on a bound. */
const grace = 0.01

/** Every relation that the card does not keep, with the usual bounds. */
export function misfits(card: Card): readonly Misfit[] {
  return relations
    .map((relation) => relationOn(card, relation))
    .filter((found) => found !== undefined)
    .filter(({ value, low, high }) => value < low - grace || value > high + grace)
}

export function concerns({ relation }: Misfit, id: string): boolean {
  return relation.judged === id || relation.by.includes(id)
}

/** Body measurements by id, mm. */
export type Card = Readonly<Record<string, number>>

/** The finite value that the card itself holds, or undefined: nothing inherited, no NaN. */
export function valueOn(card: Card, id: string): number | undefined {
  const value = Object.hasOwn(card, id) ? card[id] : undefined
  return typeof value === 'number' && Number.isFinite(value) ? value : undefined
}

import type { Draft, DraftOrder, RemedyDefinition, RemedyMove } from './contract'
import { draftGarment } from './draft-garment'
import { garments } from './garments'
import { remediesOf } from './remedies'

/** Every named fit remedy, with the garments it is offered for. */
export const remedies: readonly RemedyDefinition[] = remediesOf(garments)

/** Less than this nobody can mark, mm. */
const visible = 0.05

/**
 * What each remedy of an order moves: every mark that stands elsewhere than it would without that one, farthest first.
 * Found by drafting without it, so nothing that follows from the change is left out.
 *
 * @throws DraftingError when the order cannot be drafted
 */
export function remedyMoves(order: DraftOrder): readonly RemedyMove[] {
  const used = (order.remedies ?? []).filter(({ off }) => !off)
  if (used.length === 0) return []
  const quiet = { ...order, explain: false }
  const now = draftGarment(quiet)
  return used.flatMap((use) => {
    const others = used.filter((other) => other !== use)
    return moved(use.id, draftGarment({ ...quiet, remedies: others }), now)
  })
}

function moved(remedy: string, before: Draft, after: Draft): RemedyMove[] {
  const moves = after.pieces.flatMap((piece) => {
    const old = before.pieces.find(({ id }) => id === piece.id)?.marks
    return piece.marks.flatMap(({ id, at }): RemedyMove[] => {
      const from = old?.find((mark) => mark.id === id)?.at
      if (!from) return []
      const by = { x: at.x - from.x, y: at.y - from.y }
      const distance = Math.hypot(by.x, by.y)
      return distance < visible ? [] : [{ remedy, piece: piece.id, mark: id, by, distance }]
    })
  })
  return moves.sort((a, b) => b.distance - a.distance)
}

import type { Draft } from '@/drafting/contract'
import { corners } from './corners'
import { chordsOf, endOfPath, headingAtEnd, headingAtStart, turnFrom } from './curves'
import { Findings, type DraftLaw } from './violation'

const neverRunsOn = new Set(['seam', 'fold', 'opening', 'dart'])

/** Edges that a seam declares smooth run on without a corner; a flared side is met square by its armhole. */
export const smoothJoins: DraftLaw = (draft, order) => {
  const found = new Findings(5)
  for (const seam of draft.seams) {
    if (!seam.smooth) continue
    for (const { where, a, b } of corners(draft, seam)) {
      if (neverRunsOn.has(a.beyond.role)) continue
      found.atMost(where, 'turns across the seam, degrees', Math.abs(a.angle + b.angle - 180), 5)
    }
  }
  if (order.garment === 'flared-dress') armholesArriveSquare(found, draft)
  return found.all
}

function armholesArriveSquare(found: Findings, draft: Draft): void {
  for (const id of ['front', 'back']) {
    const piece = draft.pieces.find((one) => one.id === id)
    const armhole = piece?.edges.find((one) => one.id === 'armhole')
    const side = piece?.edges.find((one) => one.id === 'side')
    if (!armhole || !side) {
      found.add(id, 'has no armhole or no side')
      continue
    }
    const turn = turnFrom(headingAtEnd(armhole.path), headingAtStart(side.path))
    found.atMost(`${id} armhole`, 'off square to the side seam, degrees', Math.abs(turn - 90), 1)
  }
}

/** How far an armhole dips below the underarm, mm. */
export function dipOf(draft: Draft, piece: string): number {
  const armhole = draft.pieces.find((one) => one.id === piece)?.edges.find((one) => one.id === 'armhole')
  if (!armhole) return NaN
  return Math.max(...chordsOf(armhole.path).map((point) => point.y)) - endOfPath(armhole.path).y
}

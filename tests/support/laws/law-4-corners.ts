import { angleAtStart, corners } from './corners'
import { garmentOf, neckShape } from './formulas'
import { Findings, type DraftLaw } from './violation'

const sewnAt = new Set(['waist', 'hem', 'armhole', 'neckline'])

/** A fold is met square; where sewn neighbours meet at waist, hem, armhole or shoulder they make one line. */
export const squareCorners: DraftLaw = (draft, order, engine) => {
  const found = new Findings(4)
  const pointed = ['V', 'sweetheart'].includes(String(neckShape(order, garmentOf(order, engine.garments))))
  for (const piece of draft.pieces) {
    piece.edges.forEach((edge, index) => {
      const next = (index + 1) % piece.edges.length
      if (edge.role !== 'fold') return
      for (const [corner, beyond] of [
        [index, piece.edges[(index + piece.edges.length - 1) % piece.edges.length]],
        [next, piece.edges[next]],
      ] as const) {
        // The front of a V or a sweetheart is meant to be pointed, and its facing with it.
        const atPoint = pointed && piece.id.startsWith('front') && beyond?.role !== 'hem'
        if (!atPoint) {
          found.atMost(
            `${piece.id}, fold at ${beyond?.id}`,
            'off square',
            Math.abs(angleAtStart(piece, corner) - 90),
            0.5,
          )
        }
      }
    })
  }
  for (const seam of draft.seams) {
    if (seam.join !== 'plain') continue
    for (const { where, a, b } of corners(draft, seam)) {
      if (!sewnAt.has(a.beyond.role)) continue
      // Where a dart opens at the centre front there is a seam, and a V is pointed on it as it is on a fold.
      if (pointed && a.beyond.role === 'neckline' && a.piece === b.piece && a.piece.id === 'front') continue
      found.atMost(where, 'angles off 180° in all', Math.abs(a.angle + b.angle - 180), 1)
    }
  }
  return found.all
}

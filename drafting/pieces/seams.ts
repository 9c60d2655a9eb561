import type { Notch, SeamCheck } from '../contract'
import { pathLength } from '../geometry'
import type { Pen, SeamPlan } from '../pen/pen'
import { placeOnRuns, runLength, type PieceById } from './runs'

/** Measures a planned seam: what it differs by once its ease is counted. */
export function checkSeam(plan: SeamPlan, pieces: PieceById, pen: Pen): SeamCheck {
  const a = plan.a.reduce((sum, run) => sum + runLength(run, pieces), 0)
  const b = plan.b.reduce((sum, run) => sum + runLength(run, pieces), 0)
  const ease = plan.easeFrom ? pen.value(plan.easeFrom) : 0
  return {
    id: plan.id,
    name: plan.name,
    a: plan.a,
    b: plan.b,
    join: plan.join ?? 'plain',
    ease,
    ...(plan.easeFrom ? { easeFrom: plan.easeFrom } : {}),
    difference: a - b - ease,
    matches: [{ a: 0, b: 0 }, ...(plan.matches ?? []), { a, b }],
    smooth: plan.smooth ?? false,
  }
}

/** The notches that a seam's matches ask for, by piece. Where an edge begins or ends the corner itself is the match. */
export function notchesOf(
  seam: SeamCheck,
  ticks: 1 | 2,
  pieces: PieceById,
): readonly { readonly piece: string; readonly notch: Notch }[] {
  const found: { piece: string; notch: Notch }[] = []
  for (const [index, match] of seam.matches.entries()) {
    for (const side of ['a', 'b'] as const) {
      const place = placeOnRuns(seam[side], match[side], pieces)
      const edge = pieces.get(place?.piece ?? '')?.edges.find((one) => one.id === place?.edge)
      if (!place || !edge || place.at < 0.5 || place.at > pathLength(edge.path) - 0.5) continue
      found.push({
        piece: place.piece,
        notch: { id: `${seam.id}-${index}`, edge: place.edge, at: place.at, ticks },
      })
    }
  }
  return found
}

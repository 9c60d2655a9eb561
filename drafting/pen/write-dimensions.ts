import type { Dimension } from '../contract'
import { distance } from '../geometry'
import type { Pen } from './pen'

/** Turns the tags that the garment asked for into dimensions, in drafting order. */
export function writeDimensions(pen: Pen): Dimension[] {
  return pen.tags.map((plan) => {
    const piece = pen.pieces.find((one) => one.id === plan.piece)
    if (!piece) throw new Error(`A tag names the piece “${plan.piece}”, which was not drawn.`)
    // A tag shows what the rules and the style say: where a mark was corrected, the place that they gave it.
    const byRule = (id: string): string => (piece.marks.has(`${id}-by-rule`) ? `${id}-by-rule` : id)
    const from = piece.at(byRule(plan.from))
    const to = piece.at(byRule(plan.to))
    return {
      id: `${plan.piece}.${plan.from}-${plan.to}`,
      piece: plan.piece,
      from,
      to,
      label: plan.label,
      length: distance(from, to),
      shows: plan.value ? 'value' : 'result',
      ...(plan.value ? { value: plan.value } : {}),
      ...(plan.over ? { over: plan.over } : {}),
      ...(plan.step ? { step: plan.step } : { step: `${plan.piece}.${plan.to}` }),
      ...(plan.edge ? { edge: plan.edge } : {}),
    }
  })
}

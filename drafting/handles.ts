import type { DraftOrder, Handle, HandleMove, Point } from './contract'
import { draw, readyOrder } from './draft-garment'
import { DraftingError } from './drafting-error'
import type { Pen } from './pen/pen'

/** Half the step by which a value is changed to see what moves: mm for lengths, and about the same for shares and angles. */
const steps = { length: 0.5, angle: 0.05, share: 0.0005 } as const

/**
 * The marks that may be dragged, each with the style values that move it. Found by redrafting with each value a little
 * changed, so it holds for any garment; near the current draft it is true to the second order.
 *
 * @throws DraftingError when the order itself cannot be drafted.
 */
export function handles(order: DraftOrder): readonly Handle[] {
  const quiet: DraftOrder = { ...order, explain: false }
  const { garment, ready } = readyOrder(quiet)
  const redraw = (value: string, number: number): Pen | undefined => {
    try {
      return draw(garment, quiet, { ...ready, design: { ...ready.design, [value]: number } })
    } catch (error) {
      if (error instanceof DraftingError) return undefined
      throw error
    }
  }
  const now = draw(garment, quiet, ready)
  const around = new Map<string, { before: Pen; after: Pen; change: number } | undefined>()
  const neighbours = (value: string) => {
    if (!around.has(value)) {
      const definition = garment.definition.design.find((one) => one.id === value)
      const current = ready.design[value]
      const step =
        definition && definition.kind in steps ? steps[definition.kind as keyof typeof steps] : undefined
      if (step === undefined || typeof current !== 'number') around.set(value, undefined)
      else {
        // At the edge of what can be drawn one side is missing: look to the other side only.
        const before = redraw(value, current - step) ?? now
        const after = redraw(value, current + step) ?? now
        const change = (before === now ? 0 : step) + (after === now ? 0 : step)
        around.set(value, change > 0 ? { before, after, change } : undefined)
      }
    }
    return around.get(value)
  }

  const found: Handle[] = []
  for (const piece of now.pieces) {
    for (const [mark, values] of piece.drags) {
      const moves: HandleMove[] = []
      for (const value of values) {
        const near = neighbours(value)
        const from = near && markAt(near.before, piece.id, mark)
        const to = near && markAt(near.after, piece.id, mark)
        if (!near || !from || !to) continue
        const moved = Math.hypot(to.x - from.x, to.y - from.y)
        if (moved < 1e-6) continue
        moves.push({
          value,
          along: { x: (to.x - from.x) / moved, y: (to.y - from.y) / moved },
          perMm: near.change / moved,
        })
      }
      if (moves.length)
        found.push({ id: `${piece.id}.${mark}`, piece: piece.id, mark, at: piece.at(mark), moves })
    }
  }
  return found
}

function markAt(pen: Pen, piece: string, mark: string): Point | undefined {
  return pen.pieces.find((one) => one.id === piece)?.marks.get(mark)?.at
}

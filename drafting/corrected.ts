import type { Piece, Problem, SeamCheck } from './contract'
import { endOf, selfIntersections, startOf } from './geometry'
import { DraftingError } from './drafting-error'
import type { Pen } from './pen/pen'
import { stitchLine } from './pieces/stitch-line'

/** One problem for each correction that is switched on. */
const blaming = (ids: readonly string[], message: string): Problem[] =>
  ids.map((id) => ({ field: `corrections.${id}`, code: 'impossible-shape', message }))

/**
 * What to say of a draft that cannot be drawn with its corrections. Where it can be drawn without them they are at fault, and are
 * named beside what they made impossible.
 *
 * @param drawsWithout whether the same order without corrections can be drawn.
 */
export function withCorrectionsNamed(
  error: unknown,
  ids: readonly string[],
  drawsWithout: () => boolean,
): unknown {
  if (!(error instanceof DraftingError) || ids.length === 0) return error
  if (error.problems.some((problem) => problem.field.startsWith('corrections.'))) return error
  if (!drawsWithout()) return error
  const [first] = error.problems
  const message = `With this correction the garment cannot be drawn. ${first?.message ?? ''} Correct by less, or switch it off.`
  return new DraftingError([...blaming(ids, message), ...error.problems])
}

/**
 * Refuses a corrected draft that could not be sewn: whose seams do not agree, whose fold is not straight or whose outline crosses
 * itself. Rules and styles never lead there; a correction may.
 */
export function judgeCorrected(pen: Pen, pieces: readonly Piece[], seams: readonly SeamCheck[]): void {
  const ids = pen.corrections.active
  if (ids.length === 0) return
  const refuse = (message: string): never => {
    throw new DraftingError(blaming(ids, message))
  }
  const allowed = Math.max(0.5, (pen.tape ?? 0) / 2)
  const off = seams.find((seam) => Math.abs(seam.difference) > allowed + 1e-6)
  if (off) {
    refuse(
      `With this correction the two sides of “${off.name}” would differ by ${pen.say(Math.abs(off.difference))}. Correct the same point on both pieces, or correct by less.`,
    )
  }
  for (const piece of pieces) {
    const name = piece.name.toLowerCase()
    for (const edge of piece.edges) {
      const upright = edge.role === 'fold' && edge.id === 'centre'
      if (upright && Math.abs(startOf(edge.path).x - endOf(edge.path).x) > 1e-6)
        refuse(`With this correction the fold of the ${name} would not be straight. Move it up or down only.`)
    }
    if (selfIntersections(stitchLine(piece)).length > 0)
      refuse(`With this correction the outline of the ${name} would cross itself. Correct by less.`)
  }
}

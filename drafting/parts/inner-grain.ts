import type { Path, Point } from '../contract'
import { intersections } from '../geometry'
import { straight } from '../pen/piece-pen'

/** How far a grain line keeps from the edges it runs between, mm, where there is room for that. */
const clear = 5

/**
 * A grain line for a piece of awkward shape, a narrow curved band for one: upright, between two of its edges and off both.
 *
 * @param outline the piece's edges, all the way round.
 * @param columns where it may stand, mm from the centre, the best place first: a later one is taken only when it gives a line
 *   that is longer by half.
 * @returns the line, downwards; undefined when no column crosses the piece.
 */
export function innerGrain(
  outline: readonly Path[],
  columns: readonly number[],
): { readonly from: Point; readonly to: Point } | undefined {
  let best: { x: number; top: number; bottom: number } | undefined
  for (const x of columns) {
    const column = straight({ x, y: -1000 }, { x, y: 3000 })
    const levels = outline
      .flatMap((path) => intersections(path, column).map(({ point }) => point.y))
      .sort((one, other) => one - other)
    // Two edges that meet on the column, or one that only touches it, leave no in and out to tell.
    if (levels.length % 2 !== 0) continue
    for (let index = 0; index < levels.length; index += 2) {
      const top = levels[index] ?? 0
      const bottom = levels[index + 1] ?? 0
      if (!best || bottom - top > 1.5 * (best.bottom - best.top)) best = { x, top, bottom }
    }
  }
  if (!best) return undefined
  const off = Math.min(clear, (best.bottom - best.top) / 4)
  return { from: { x: best.x, y: best.top + off }, to: { x: best.x, y: best.bottom - off } }
}

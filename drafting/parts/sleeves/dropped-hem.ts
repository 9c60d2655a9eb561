import type { Path, Point } from '../../contract'
import { add, cubic, openPath, scale } from '../../geometry'

/** From the front seam down to the dropped middle and up again to the back seam, level at all three. */
export function droppedHem(front: Point, back: Point, middle: Point): Path {
  const half = (from: Point, to: Point) =>
    cubic(
      from,
      { x: from.x + (to.x - from.x) * 0.45, y: from.y },
      { x: to.x - (to.x - from.x) * 0.45, y: to.y },
      to,
    )
  return openPath([half(front, middle), half(middle, back)])
}

/**
 * From the front seam down to a lowest point, level there, and up to the back seam, square to both seams. What is gathered
 * may bend both ways.
 *
 * @param leaves, arrives unit directions at the front and at the back seam, in the sense of travel.
 */
export function dippedHem(front: Point, leaves: Point, lowest: Point, back: Point, arrives: Point): Path {
  const ahead = 0.45 * (front.x - lowest.x)
  const behind = 0.45 * (lowest.x - back.x)
  return openPath([
    cubic(front, add(front, scale(leaves, ahead)), { x: lowest.x + ahead, y: lowest.y }, lowest),
    cubic(lowest, { x: lowest.x - behind, y: lowest.y }, add(back, scale(arrives, -behind)), back),
  ])
}

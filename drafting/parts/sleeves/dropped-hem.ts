import type { Path, Point } from '../../contract'
import { cubic, openPath } from '../../geometry'

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

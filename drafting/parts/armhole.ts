import type { Path, Point } from '../contract'
import { add, cubic, distance, openPath, perpendicular, scale } from '../geometry'

/**
 * The armhole of one half: it leaves the shoulder square, is deepest at the hollow, then turns in a J to the underarm, where
 * it arrives square to the side seam. With a flared side seam that takes it a little below the underarm.
 *
 * @param tip shoulder tip.
 * @param hollow the innermost point, about half way down.
 * @param underarm where the side seam begins.
 * @param shoulder unit direction of the shoulder line, outwards.
 * @param side unit direction of the side seam, downwards.
 */
export function armholeCurve(tip: Point, hollow: Point, underarm: Point, shoulder: Point, side: Point): Path {
  const upper = distance(tip, hollow)
  const fall = underarm.y - hollow.y
  const run = underarm.x - hollow.x
  const leaves = perpendicular(shoulder)
  // Long enough to dip under the arm on a slight body, short enough not to hang there on a full one.
  const reach = Math.min(Math.max(run * 0.5, Math.min(run * 0.9, 40)), 75)
  // Square to the side seam, outwards: the seam's direction turned a quarter back.
  const arrives = { x: side.y, y: -side.x }
  // A sloping shoulder must not carry the curve past its own hollow.
  const inwards = -leaves.x
  const hollowed = tip.x - hollow.x
  const start =
    inwards > 1e-9 ? Math.max(upper * 0.08, Math.min(upper * 0.36, (0.6 * hollowed) / inwards)) : upper * 0.36
  return openPath([
    cubic(tip, add(tip, scale(leaves, start)), { x: hollow.x, y: hollow.y - upper * 0.36 }, hollow),
    cubic(
      hollow,
      { x: hollow.x, y: hollow.y + fall * 0.66 },
      add(underarm, scale(arrives, -reach)),
      underarm,
    ),
  ])
}

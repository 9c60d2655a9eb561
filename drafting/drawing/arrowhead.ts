import type { Path, Point } from '../contract'
import { add, perpendicular, scale, subtract } from '../geometry/point'
import { polyline } from '../geometry/path'

/** A filled arrowhead. `direction` is a unit vector; the tip lies at `tip`. mm. */
export function arrowhead(tip: Point, direction: Point, length: number, width: number): Path {
  const base = subtract(tip, scale(direction, length))
  const half = scale(perpendicular(direction), width / 2)
  const outline = polyline([tip, add(base, half), subtract(base, half), tip])
  return { ...outline, closed: true }
}

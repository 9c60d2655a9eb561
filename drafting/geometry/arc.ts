import type { Path, Point, Segment } from '../contract'
import { towards } from './point'
import { cubic } from './segment'
import { openPath } from './path'

/** Off the true circle by no more than this, mm. */
const TOLERANCE = 0.005

/**
 * Circular arc as cubics, from one angle to another in degrees (0° = +x, 90° = down; clockwise when `toDegrees` is the
 * larger). Within 0.005 mm of the circle up to a radius of 3 m and beyond. No angle between gives an empty path.
 */
export const arcPath = (centre: Point, radius: number, fromDegrees: number, toDegrees: number): Path => {
  const turn = toDegrees - fromDegrees
  if (turn === 0 || !(radius > 0) || !Number.isFinite(turn)) return openPath([])
  // A cubic over the angle a (radians) with handles 4/3·tan(a/4) strays by about radius·(2/27)·(a/4)⁶·…; 1.9e-5·r·a⁶ at most.
  const widest = Math.min(Math.PI / 2, (TOLERANCE / (1.9e-5 * radius)) ** (1 / 6))
  const count = Math.max(1, Math.ceil(Math.abs((turn * Math.PI) / 180) / widest - 1e-9))
  const each = turn / count
  const handle = (4 / 3) * Math.tan((each * Math.PI) / 720) * radius
  const segments: Segment[] = []
  let direction = towards(fromDegrees)
  let from: Point = { x: centre.x + direction.x * radius, y: centre.y + direction.y * radius }
  for (let i = 1; i <= count; i++) {
    const next = towards(i === count ? toDegrees : fromDegrees + each * i)
    const to = { x: centre.x + next.x * radius, y: centre.y + next.y * radius }
    segments.push(
      cubic(
        from,
        { x: from.x - direction.y * handle, y: from.y + direction.x * handle },
        { x: to.x + next.y * handle, y: to.y - next.x * handle },
        to,
      ),
    )
    direction = next
    from = to
  }
  return openPath(segments)
}

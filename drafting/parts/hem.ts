import type { Path, Point } from '../contract'
import { add, cubic, openPath, scale } from '../geometry'

/**
 * A fair curve between two points that leaves the first in one direction and arrives at the second in another, both ends
 * square to what they meet. The handles reach the same share of the way to where the two directions cross, so the curve bends
 * one way only.
 *
 * @param leaves unit direction at the start.
 * @param arrives unit direction at the end, in the sense of travel.
 * @param share how near the handles come to the crossing, 0…1.
 * @returns undefined when the directions do not cross ahead, so that a curve would have to bend both ways.
 */
export function fairCurve(
  from: Point,
  leaves: Point,
  to: Point,
  arrives: Point,
  share = 0.6,
): Path | undefined {
  const dx = to.x - from.x
  const dy = to.y - from.y
  const turn = leaves.x * arrives.y - leaves.y * arrives.x
  const chord = Math.hypot(dx, dy)
  if (Math.abs(turn) < 1e-6) {
    // Parallel ends: a straight line if they look at each other.
    const off = Math.abs(leaves.x * dy - leaves.y * dx)
    if (off > 1e-3 * chord) return undefined
    return openPath([
      cubic(from, add(from, scale(leaves, chord / 3)), add(to, scale(arrives, -chord / 3)), to),
    ])
  }
  const ahead = (dx * arrives.y - dy * arrives.x) / turn
  const behind = (leaves.x * dy - leaves.y * dx) / turn
  if (ahead <= 0 || behind <= 0) return undefined
  return openPath([
    cubic(from, add(from, scale(leaves, ahead * share)), add(to, scale(arrives, -behind * share)), to),
  ])
}

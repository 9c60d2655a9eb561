import type { Point } from '../contract'
import { pathLength } from '../geometry/path'
import { dot, subtract } from '../geometry/point'
import { line } from '../geometry/segment'
import { meetLine } from './meet-line'
import { mitre } from './mitre'
import type { Side, Turn } from './outline-edge'

/**
 * A fold is cut nothing to spare: its line runs on straight to the neighbour's cut line (or stops short there), so that the
 * other half, unfolded, goes on without a jog.
 */
export const foldCorner = (a: Side, b: Side, at: Point): Turn => {
  const aIsFold = a.edge.role === 'fold'
  if (aIsFold && b.edge.role === 'fold') return mitre(a, b, at)
  const along = aIsFold ? a.arriving : b.leaving
  const met = aIsFold ? meetLine(b, true, at, along) : meetLine(a, false, at, along)
  if (!met) return mitre(a, b, at)
  const past = dot(subtract(met.point, at), along)
  if (aIsFold) {
    const leave = past < 0 ? pathLength(a.offset) + past : undefined
    return {
      joint: met.point,
      leave,
      lead: met.along === undefined ? [line(met.point, b.start)] : [],
      enter: met.along,
    }
  }
  return past > 0
    ? { joint: met.point, leave: met.along, lead: [], enter: past }
    : { joint: met.point, leave: met.along, lead: [line(met.point, b.start)] }
}

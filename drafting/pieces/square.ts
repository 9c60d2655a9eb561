import type { Point } from '../contract'
import { dot, subtract } from '../geometry/point'
import { line } from '../geometry/segment'
import { meetLine } from './meet-line'
import { mitre } from './mitre'
import { MITRE_LIMIT, type Side, type Turn } from './outline-edge'

/**
 * Cut square across the seam, so that its allowance, pressed open, ends level with the neighbour's cut line: the seam line
 * runs on to the neighbour's offset and the allowance ends at right angles there. The seam is the neighbour of role 'seam';
 * where both or neither are, the edge that starts at the corner. (Common practice, no published source.) Where the seam line
 * does not run on into the neighbour's allowance within 2.5 × the larger allowance, a mitre.
 */
export const square = (a: Side, b: Side, at: Point): Turn => {
  const seamEnds = a.edge.role === 'seam' && b.edge.role !== 'seam'
  const limit = MITRE_LIMIT * Math.max(a.allowance, b.allowance)
  const onward = seamEnds ? a.arriving : { x: -b.leaving.x, y: -b.leaving.y }
  const met = seamEnds ? meetLine(b, true, at, onward) : meetLine(a, false, at, onward)
  if (!met) return mitre(a, b, at)
  const run = dot(subtract(met.point, at), onward)
  if (run < 0 || run > limit) return mitre(a, b, at)
  if (seamEnds) {
    const corner: Point = { x: a.end.x + onward.x * run, y: a.end.y + onward.y * run }
    const lead = [line(corner, met.point)]
    if (met.along === undefined) lead.push(line(met.point, b.start))
    return { joint: corner, lead, enter: met.along }
  }
  const corner: Point = { x: b.start.x + onward.x * run, y: b.start.y + onward.y * run }
  return { joint: met.point, leave: met.along, lead: [line(met.point, corner), line(corner, b.start)] }
}

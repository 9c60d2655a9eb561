import type { Path, Point, Segment } from '../contract'
import { endOf, endTangent } from '../geometry/ends'
import { intersections } from '../geometry/intersect'
import { joinPaths, openPath, reversePath, slicePath } from '../geometry/path'
import { cross, distance } from '../geometry/point'
import { line } from '../geometry/segment'
import { mirrorIn, transformPath } from '../geometry/transform'
import { meetLine } from './meet-line'
import { mitre } from './mitre'
import { MITRE_LIMIT, type Side, type Turn } from './outline-edge'
import { startingAt, upTo } from './stretch'

/** Whether an edge is turned up like a hem. */
const isHem = (side: Side): boolean => side.edge.role === 'hem' || side.edge.finish === 'turned'

/**
 * The end of a hem's allowance, shaped so that it lies on the seam when the hem is turned up: the neighbour's cut line
 * mirrored in the tangent of the hem at the corner. The hem is the neighbour of role 'hem', else the one that is turned.
 * Where neither is, at an inner corner, or where the mirrored line does not reach the hem's cut line near the corner, a mitre.
 */
export const turned = (a: Side, b: Side, at: Point): Turn => {
  const hemEnds = a.edge.role === 'hem' || (isHem(a) && !isHem(b))
  const hem = hemEnds && b.edge.role !== 'hem' ? a : b
  const convex = cross(a.arriving, b.leaving) > 0
  if (!convex || !isHem(hem) || hem.allowance === 0) return mitre(a, b, at)
  return hem === b ? hemStarts(a, b, at) : hemStops(a, b, at)
}

/** The neighbour's cut comes in, is mirrored at the hem line and meets the hem's cut. */
const hemStarts = (a: Side, b: Side, at: Point): Turn => {
  const turn = meetLine(a, false, at, b.leaving)
  if (!turn) return mitre(a, b, at)
  const above = upTo(a, turn.point, turn.along, 4 * (a.allowance + b.allowance))
  const below = mirrored(reversePath(above), at, b.leaving, turn.point)
  const found = reach(below, b, true)
  if (!found || isFar(endOf(found.along), at, a, b)) return mitre(a, b, at)
  const lead: Segment[] = [...found.along.segments]
  if (found.enter === undefined) lead.push(line(endOf(found.along), b.start))
  return { joint: turn.point, leave: turn.along, lead, enter: found.enter }
}

/** The hem's cut ends where the neighbour's mirrored cut meets it. */
const hemStops = (a: Side, b: Side, at: Point): Turn => {
  const turn = meetLine(b, true, at, a.arriving)
  if (!turn) return mitre(a, b, at)
  const above = startingAt(b, turn.point, turn.along, 4 * (a.allowance + b.allowance))
  const below = mirrored(above, at, a.arriving, turn.point)
  const found = reach(below, a, false)
  if (!found || isFar(endOf(found.along), at, a, b)) return mitre(a, b, at)
  const back = reversePath(found.along)
  const lead: Segment[] = [...back.segments]
  if (turn.along === undefined) lead.push(line(turn.point, b.start))
  return { joint: back.segments[0]?.from ?? turn.point, leave: found.enter, lead, enter: turn.along }
}

/** Whether a corner's point is further out than a mitre may reach. */
const isFar = (point: Point, at: Point, a: Side, b: Side): boolean =>
  distance(point, at) > MITRE_LIMIT * Math.max(a.allowance, b.allowance)

/** Mirrored in the hem line, starting exactly at the given point on it. */
const mirrored = (path: Path, at: Point, along: Point, from: Point): Path => {
  const flipped = transformPath(mirrorIn(at, { x: at.x + along.x, y: at.y + along.y }), path)
  const [first, ...rest] = flipped.segments
  if (!first) return flipped
  return openPath([first.kind === 'line' ? line(from, first.to) : { ...first, from }, ...rest])
}

/** The mirrored line up to the hem's cut, itself continued straight; where on the cut that is. */
const reach = (
  below: Path,
  hem: Side,
  atStart: boolean,
): { readonly along: Path; readonly enter: number | undefined } | undefined => {
  const far = 10 * hem.allowance + 50
  const end = endOf(below)
  const onward = endTangent(below)
  const long = joinPaths(
    below,
    openPath([line(end, { x: end.x + onward.x * far, y: end.y + onward.y * far })]),
  )
  const from = atStart ? hem.start : hem.end
  const out = atStart ? { x: -hem.leaving.x, y: -hem.leaving.y } : hem.arriving
  const run = openPath([line(from, { x: from.x + out.x * far, y: from.y + out.y * far })])
  const outside = intersections(long, run)[0]
  const inside = intersections(long, hem.offset)[0]
  const first = outside && (!inside || outside.a <= inside.a) ? outside : inside
  if (!first) return undefined
  return { along: slicePath(long, 0, first.a), enter: first === outside ? undefined : first.b }
}

import type { Draft, Edge, Piece, Point } from '@/drafting/contract'
import { angleAtStart } from './corners'
import { chordsOf, endOfPath, headingAtEnd, headingAtStart, mix, placeOn, startOfPath } from './curves'
import { Chain, closedChain, insideRing, ringOf, stitchPath } from './outline'
import { Findings, type DraftLaw } from './violation'

const tolerance = 0.05
/** How much nearer than it is a place may seem to an edge that is looked at as chords; nearer still, the edge swallows it. */
const drawn = 0.005
/** A mitre runs on to at most so many times the larger allowance. */
const mitreLimit = 2.5

/** An edge made ready to be measured from. */
interface Side {
  readonly edge: Edge
  readonly allowance: number
  readonly chain: Chain
  readonly start: Point
  readonly end: Point
  readonly leaving: Point
  readonly arriving: Point
}

/**
 * Each edge's cut is its outer offset by its allowance, to the twentieth of a millimetre both ways; beyond its ends it does
 * what the corner says. What no offset can keep is said in a caution.
 */
export const cutLines: DraftLaw = (draft) => {
  const found = new Findings(6)
  for (const piece of draft.pieces) {
    const sides = piece.edges.map((edge): Side => ({
      edge,
      allowance: edge.role === 'fold' ? 0 : edge.allowance,
      chain: new Chain(chordsOf(edge.path, 0.0005)),
      start: startOfPath(edge.path),
      end: endOfPath(edge.path),
      leaving: headingAtStart(edge.path),
      arriving: headingAtEnd(edge.path),
    }))
    piece.edges.forEach((edge) => {
      if (edge.role === 'fold' && edge.allowance !== 0)
        found.add(`${piece.id}.${edge.id}`, 'is a fold with an allowance')
    })
    outside(found, piece)
    sides.forEach((side, index) => {
      offsetReached(found, draft, piece, sides, index)
      cutExplained(found, piece, sides, index)
      corner(found, piece, sides, index)
    })
  }
  return found.all
}

const left = (heading: Point): Point => ({ x: heading.y, y: -heading.x })
const push = (from: Point, along: Point, by: number): Point => ({
  x: from.x + along.x * by,
  y: from.y + along.y * by,
})
/** Distance of a point from a line, positive on the outer side of an edge that runs along it. */
const out = (point: Point, on: Point, heading: Point): number =>
  (point.x - on.x) * heading.y - (point.y - on.y) * heading.x
const mirrored = (point: Point, on: Point, heading: Point): Point =>
  push(point, left(heading), -2 * out(point, on, heading))

function neighbours(sides: readonly Side[], index: number): readonly [before: Side, after: Side] {
  const count = sides.length
  return [sides[(index + count - 1) % count] as Side, sides[(index + 1) % count] as Side]
}

/** The edges of a piece where it is hemmed are the mirrors of turned corners. */
const isHem = (side: Side): boolean => side.edge.role === 'hem'

function outside(found: Findings, piece: Piece): void {
  const stitch = ringOf(stitchPath(piece), 0.002)
  const line = closedChain(stitch)
  for (const point of chordsOf(piece.cutLine)) {
    if (!insideRing(stitch, point) || line.gap(point) <= 0.01) continue
    found.add(piece.id, `the cut line lies inside the stitch line at ${shown(point)}`)
    return
  }
}

const shown = (point: Point): string => `${point.x.toFixed(2)}, ${point.y.toFixed(2)}`

/** Every place of the true offset lies on the cut, but for what a corner or a narrow curve takes away. */
function offsetReached(
  found: Findings,
  draft: Draft,
  piece: Piece,
  sides: readonly Side[],
  index: number,
): void {
  const side = sides[index] as Side
  const { edge, allowance } = side
  if (edge.role === 'dart') return
  const cut = new Chain(chordsOf(edge.cut, 0.001))
  let worst = 0
  let at: Point | undefined
  let swallowed = false
  for (const segment of edge.path.segments) {
    const hull = segment.kind === 'line' ? 60 : 40
    for (let step = 0; step <= hull; step += 1) {
      const { at: on, slope, bend } = placeOn(segment, step / hull)
      const speed = Math.hypot(slope.x, slope.y)
      if (speed < 1e-6) continue
      const point = push(on, left({ x: slope.x / speed, y: slope.y / speed }), allowance)
      if (allowance > 0 && side.chain.gap(point) < allowance - drawn) {
        // Turning to the left it bends towards its own allowance.
        const curvature = (slope.y * bend.x - slope.x * bend.y) / speed ** 3
        swallowed ||= curvature * allowance > 1
        continue
      }
      if (takenByOthers(point, sides, index)) continue
      const gap = cut.gap(point)
      if (gap > worst) {
        worst = gap
        at = point
      }
    }
  }
  if (at && worst > tolerance) {
    found.atMost(`${piece.id}.${edge.id}`, `offset not on the cut line at ${shown(at)}`, worst, tolerance)
  }
  const said = draft.cautions.some((one) => one.code === 'allowance-clipped' && one.fields.includes(edge.id))
  if (swallowed && !said) {
    found.add(`${piece.id}.${edge.id}`, 'its allowance is wider than its curve and no caution says so')
  }
}

/** Whether a place of the offset lies in the allowance of another edge, beyond a fold, or beyond a turned corner. */
function takenByOthers(point: Point, sides: readonly Side[], index: number): boolean {
  const [before, after] = neighbours(sides, index)
  const own = sides[index] as Side
  for (const [place, other] of sides.entries()) {
    if (place === index) continue
    if (other.edge.role === 'fold') {
      if (out(point, other.start, other.leaving) > -0.001) return true
    } else if (other.allowance > 0 && other.chain.gap(point) < other.allowance - tolerance) return true
  }
  if (beyondMitre(point, own, before, own.start, before.end, before.arriving)) return true
  if (beyondMitre(point, own, after, own.end, after.start, after.leaving)) return true
  // The hem's own allowance ends where the mirrored neighbour passes.
  if (isHem(own)) {
    if (own.edge.startCorner === 'turned' && !isHem(before)) {
      const back = mirrored(point, own.start, own.leaving)
      if (before.chain.gap(back) > before.allowance - tolerance && out(back, before.end, before.arriving) > 0)
        return true
    }
    if (after.edge.startCorner === 'turned' && !isHem(after)) {
      const back = mirrored(point, own.end, own.arriving)
      if (after.chain.gap(back) > after.allowance - tolerance && out(back, after.start, after.leaving) > 0)
        return true
    }
  }
  return false
}

/** Near a corner the neighbour's allowance runs straight on, and what lies beyond that line is cut off. */
function beyondMitre(
  point: Point,
  own: Side,
  other: Side,
  corner: Point,
  on: Point,
  heading: Point,
): boolean {
  const largest = Math.max(own.allowance, other.allowance)
  const near = Math.hypot(point.x - corner.x, point.y - corner.y) <= 3 * largest
  return near && out(point, on, heading) > other.allowance - tolerance
}

/** Every place of the cut is the offset of its edge, or runs on beyond an end as the corner there says. */
function cutExplained(found: Findings, piece: Piece, sides: readonly Side[], index: number): void {
  const side = sides[index] as Side
  const { edge, allowance, chain } = side
  const [before, after] = neighbours(sides, index)
  if (edge.role === 'dart') return
  const where = `${piece.id}.${edge.id}`
  for (const point of spread(chordsOf(edge.cut, 0.005))) {
    if (edge.role === 'fold') {
      const off = Math.abs(out(point, side.start, side.leaving))
      if (off > 0.01) return found.atMost(where, `cut off the fold line at ${shown(point)}`, off, 0.01)
      continue
    }
    const { gap, index: at, share } = chain.nearest(point)
    const on = mix(chain.points[at] as Point, chain.points[at + 1] as Point, share)
    const atStart = Math.hypot(on.x - side.start.x, on.y - side.start.y) < 0.3
    const atEnd = Math.hypot(on.x - side.end.x, on.y - side.end.y) < 0.3
    const error = Math.abs(gap - allowance)
    if (error <= tolerance) continue
    const straightOn =
      (atStart && Math.abs(out(point, side.start, side.leaving) - allowance) <= tolerance) ||
      (atEnd && Math.abs(out(point, side.end, side.arriving) - allowance) <= tolerance)
    if (straightOn) continue
    if (mirroredAt(point, side, after, after.edge.startCorner, side.end, side.arriving)) continue
    if (mirroredAt(point, side, before, edge.startCorner, side.start, side.leaving)) continue
    if (atEnd && explainedByCorner(point, side, after, after.edge.startCorner, side.end)) continue
    if (atStart && explainedByCorner(point, before, side, edge.startCorner, side.start)) continue
    // An edge that its neighbours swallow gives one point, and that is said.
    if (edge.cut.segments.length === 1 && edge.cut.segments[0]?.kind === 'line') {
      const only = edge.cut.segments[0]
      if (only.from.x === only.to.x && only.from.y === only.to.y) continue
    }
    return found.atMost(where, `cut line not at its allowance at ${shown(point)}`, error, tolerance)
  }
}

/** Points of a chain with others between, so that long straight stretches are looked at too. */
function* spread(points: readonly Point[]): Generator<Point> {
  for (const [index, point] of points.entries()) {
    const before = points[index - 1]
    const apart = before ? Math.hypot(point.x - before.x, point.y - before.y) : 0
    if (before && apart > 20) for (const share of [0.02, 0.1, 0.5, 0.9, 0.98]) yield mix(before, point, share)
    yield point
  }
}

function explainedByCorner(
  point: Point,
  first: Side,
  second: Side,
  kind: Edge['startCorner'],
  corner: Point,
): boolean {
  const reach = Math.hypot(point.x - corner.x, point.y - corner.y)
  const largest = Math.max(first.allowance, second.allowance)
  // Behind a fold the cut runs on to the fold line.
  if (first.edge.role === 'fold' || second.edge.role === 'fold') return false
  if (kind === 'turned' && (isHem(first) || isHem(second))) {
    const [hem, on, heading] = isHem(second)
      ? [second, second.start, second.leaving]
      : [first, first.end, first.arriving]
    return Math.abs(out(point, on, heading) - hem.allowance) <= tolerance
  }
  // The flat end of a limited mitre, or the straight side of a step or a squared corner.
  return reach <= mitreLimit * largest + tolerance
}

/** Whether a place of a hem's cut is its neighbour's cut mirrored in the hem. */
function mirroredAt(
  point: Point,
  hem: Side,
  other: Side,
  kind: Edge['startCorner'],
  corner: Point,
  heading: Point,
): boolean {
  if (kind !== 'turned' || !isHem(hem)) return false
  const back = mirrored(point, corner, heading)
  return Math.abs(other.chain.gap(back) - other.allowance) <= tolerance
}

/** A mitre within its limit has its point on the cut line; a turned corner mirrors its neighbour in the hem. */
function corner(found: Findings, piece: Piece, sides: readonly Side[], index: number): void {
  const side = sides[index] as Side
  const [before] = neighbours(sides, index)
  if ([side, before].some(({ edge }) => edge.role === 'fold' || edge.role === 'dart')) return
  const line = closedChain(ringOf(piece.cutLine, 0.002))
  const where = `${piece.id}, corner at the start of ${side.edge.id}`
  // Where a narrow curve swallows the very end of its allowance, no mitre is left to look for.
  if (swallowedAt(before, before.end, before.arriving) || swallowedAt(side, side.start, side.leaving)) return
  if (bentTooMuch(before, 1) || bentTooMuch(side, 0)) return
  if (side.edge.startCorner === 'mitre') {
    const angle = angleAtStart(piece, index)
    if (angle > 178 || angle < 3) return
    const tip = meeting(before, side)
    if (!tip) return
    const far = Math.hypot(tip.x - side.start.x, tip.y - side.start.y)
    if (far <= mitreLimit * Math.max(before.allowance, side.allowance)) {
      found.atMost(where, 'mitre off the cut line', line.gap(tip), tolerance)
    } else {
      for (const point of chordsOf(side.edge.cut).slice(0, 1)) {
        const reach = Math.hypot(point.x - side.start.x, point.y - side.start.y)
        const most = mitreLimit * Math.max(before.allowance, side.allowance)
        found.atMost(where, 'mitre longer than its limit', reach, most + tolerance)
      }
    }
  }
  if (side.edge.startCorner === 'turned') turned(found, where, line, before, side)
}

function swallowedAt(side: Side, at: Point, heading: Point): boolean {
  return side.chain.gap(push(at, left(heading), side.allowance)) < side.allowance - tolerance
}

/** Whether an edge bends towards its allowance at its very end so much that the offset has a cusp there. */
function bentTooMuch(side: Side, end: 0 | 1): boolean {
  const { segments } = side.edge.path
  const segment = end === 0 ? segments[0] : segments[segments.length - 1]
  if (!segment) return false
  const { slope, bend } = placeOn(segment, end)
  const speed = Math.hypot(slope.x, slope.y)
  return (slope.y * bend.x - slope.x * bend.y) * side.allowance > 0.95 * speed ** 3
}

/** Where two allowances run on to each other; undefined where one is trimmed by the other instead. */
function meeting(first: Side, second: Side): Point | undefined {
  const a = push(first.end, left(first.arriving), first.allowance)
  const b = push(second.start, left(second.leaving), second.allowance)
  const { arriving: u, leaving: v } = { arriving: first.arriving, leaving: second.leaving }
  const along = ((b.x - a.x) * v.y - (b.y - a.y) * v.x) / (u.x * v.y - u.y * v.x)
  const tip = push(a, u, along)
  const behind = (b.x - tip.x) * v.x + (b.y - tip.y) * v.y
  return along > -0.01 && behind > -0.01 ? tip : undefined
}

function turned(found: Findings, where: string, line: Chain, before: Side, side: Side): void {
  const hemFirst = isHem(before)
  const [hem, other] = hemFirst ? [before, side] : [side, before]
  if (!isHem(hem) || isHem(other)) return found.add(where, 'is turned where there is no hem')
  const corner = side.start
  const heading = hemFirst ? before.arriving : side.leaving
  const stations = hemFirst ? other.edge.path.segments : [...other.edge.path.segments].reverse()
  const segment = stations[0]
  if (!segment) return
  for (let step = 0; step <= 200; step += 1) {
    const t = hemFirst ? step / 200 : 1 - step / 200
    const { at, slope } = placeOn(segment, t)
    const speed = Math.hypot(slope.x, slope.y)
    if (speed < 1e-9) continue
    const point = push(at, left({ x: slope.x / speed, y: slope.y / speed }), other.allowance)
    const depth = -out(point, corner, heading)
    if (depth < 0.2) continue
    if (depth > hem.allowance * 0.9) break
    found.atMost(where, 'mirrored cut missing', line.gap(mirrored(point, corner, heading)), tolerance)
  }
}

import type { CubicSegment, Path, Point } from '../contract'
import { evaluate } from './segment'

/**
 * Area in mm², positive when the path runs clockwise on the sheet. An open path is closed by a straight line. Exact for
 * cubics.
 */
export const signedArea = (path: Path): number => {
  const { segments } = path
  const first = segments[0]
  if (!first) return 0
  // Measured from the first point, which keeps the products small.
  const ox = first.from.x
  const oy = first.from.y
  let sum = 0
  for (const segment of segments) {
    const x0 = segment.from.x - ox
    const y0 = segment.from.y - oy
    const x3 = segment.to.x - ox
    const y3 = segment.to.y - oy
    if (segment.kind === 'line') {
      sum += (x0 * y3 - x3 * y0) / 2
    } else {
      const x1 = segment.control1.x - ox
      const y1 = segment.control1.y - oy
      const x2 = segment.control2.x - ox
      const y2 = segment.control2.y - oy
      sum +=
        (6 * (x0 * y1 - x1 * y0 + x2 * y3 - x3 * y2) +
          3 * (x0 * y2 - x2 * y0 + x1 * y2 - x2 * y1 + x1 * y3 - x3 * y1) +
          (x0 * y3 - x3 * y0)) /
        20
    }
  }
  return sum
}

/** Clockwise on the sheet (y down). */
export const isClockwise = (path: Path): boolean => signedArea(path) > 0

/** The exact box around a path; an empty path has one at the origin. */
export const bounds = (path: Path): { readonly min: Point; readonly max: Point } => {
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  const include = (x: number, y: number): void => {
    if (x < minX) minX = x
    if (x > maxX) maxX = x
    if (y < minY) minY = y
    if (y > maxY) maxY = y
  }
  for (const segment of path.segments) {
    const { from, to } = segment
    include(from.x, from.y)
    include(to.x, to.y)
    if (segment.kind === 'line') continue
    const { control1: p, control2: q } = segment
    const inside = (v: Point): boolean => v.x >= minX && v.x <= maxX && v.y >= minY && v.y <= maxY
    if (inside(p) && inside(q)) continue
    for (const t of extremes(from.x, p.x, q.x, to.x)) {
      const at = evaluate(segment, t)
      include(at.x, at.y)
    }
    for (const t of extremes(from.y, p.y, q.y, to.y)) {
      const at = evaluate(segment, t)
      include(at.x, at.y)
    }
  }
  if (minX > maxX) return { min: { x: 0, y: 0 }, max: { x: 0, y: 0 } }
  return { min: { x: minX, y: minY }, max: { x: maxX, y: maxY } }
}

/** Parameters strictly inside 0…1 where one coordinate of a cubic turns round, rising. */
const extremes = (p0: number, p1: number, p2: number, p3: number): number[] => {
  const c = p1 - p0
  const b = 2 * (p2 - 2 * p1 + p0)
  const a = p3 - 3 * p2 + 3 * p1 - p0
  const found: number[] = []
  const keep = (t: number): void => {
    if (t > 0 && t < 1) found.push(t)
  }
  const disc = b * b - 4 * a * c
  if (disc < 0) return found
  const q = -(b + (b < 0 ? -Math.sqrt(disc) : Math.sqrt(disc))) / 2
  if (a !== 0) keep(q / a)
  if (q !== 0) keep(c / q)
  if (found.length === 2 && found[0]! > found[1]!) found.reverse()
  return found
}

/**
 * Whether a point lies inside a path (closed by a straight line if it is open), by the even–odd rule. Exact for cubics; on
 * the outline itself either answer may come.
 */
export const containsPoint = (path: Path, point: Point): boolean => {
  const { segments } = path
  const first = segments[0]
  if (!first) return false
  let inside = false
  for (const segment of segments) {
    if (segment.kind === 'line') {
      if (crossesLine(segment.from, segment.to, point)) inside = !inside
    } else if (crossesCubic(segment, point)) inside = !inside
  }
  if (!path.closed && crossesLine(segments[segments.length - 1]!.to, first.from, point)) inside = !inside
  return inside
}

/** Whether a ray from the point to the right crosses the line; its lower end counts, its upper does not. */
const crossesLine = (a: Point, b: Point, p: Point): boolean =>
  a.y > p.y !== b.y > p.y && p.x < a.x + ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y)

/** Whether the ray crosses the cubic an odd number of times. */
const crossesCubic = (s: CubicSegment, p: Point): boolean => {
  const { from, control1, control2, to } = s
  if (Math.max(from.x, control1.x, control2.x, to.x) <= p.x) return false
  const above = Math.max(from.y, control1.y, control2.y, to.y) <= p.y
  const below = Math.min(from.y, control1.y, control2.y, to.y) > p.y
  if (above || below) return false
  if (Math.min(from.x, control1.x, control2.x, to.x) > p.x) return from.y > p.y !== to.y > p.y
  let odd = false
  let low = 0
  let lowY = from.y
  for (const high of [...extremes(from.y, control1.y, control2.y, to.y), 1]) {
    const highY = high === 1 ? to.y : evaluate(s, high).y
    if (lowY > p.y !== highY > p.y && evaluate(s, levelBetween(s, p.y, low, high, lowY > p.y)).x > p.x)
      odd = !odd
    low = high
    lowY = highY
  }
  return odd
}

/** Where a stretch of a cubic that only rises or only falls passes the level y. */
const levelBetween = (s: CubicSegment, y: number, from: number, to: number, falling: boolean): number => {
  let low = from
  let high = to
  for (let i = 0; i < 52; i++) {
    const t = (low + high) / 2
    if (evaluate(s, t).y > y === falling) low = t
    else high = t
  }
  return (low + high) / 2
}

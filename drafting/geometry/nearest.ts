import type { CubicSegment, Path, Point } from '../contract'
import { lengthBefore, pathLength } from './along'
import { lengthTo } from './length'
import { evaluate } from './segment'

/** The nearest place on a path: mm along it, the point there, and how far (mm) it is from the point asked about. */
export interface Nearest {
  readonly distance: number
  readonly point: Point
  readonly gap: number
}

// The best parameter found on the segment at hand and its squared gap.
let bestT = 0
let bestGap = Infinity

/**
 * The place on the path nearest to a point; the first of equals. An empty path answers the point itself with an infinite
 * gap.
 */
export const nearestOn = (path: Path, point: Point): Nearest => {
  let index = -1
  let t = 0
  let least = Infinity
  for (let i = 0; i < path.segments.length; i++) {
    const segment = path.segments[i]!
    if (segment.kind === 'line') nearestOnLine(segment.from, segment.to, point)
    else if (boxGap(segment, point) >= least) continue
    else nearestOnCubic(segment, point, least)
    if (bestGap < least) {
      least = bestGap
      t = bestT
      index = i
    }
  }
  const segment = path.segments[index]
  if (!segment) return { distance: 0, point, gap: Infinity }
  const last = t >= 1 && index === path.segments.length - 1
  return {
    distance: last ? pathLength(path) : lengthBefore(path, index) + lengthTo(segment, t),
    point: evaluate(segment, t),
    gap: Math.sqrt(least),
  }
}

const nearestOnLine = (from: Point, to: Point, p: Point): void => {
  const x = to.x - from.x
  const y = to.y - from.y
  const square = x * x + y * y
  const t = square > 0 ? ((p.x - from.x) * x + (p.y - from.y) * y) / square : 0
  bestT = t > 0 ? (t < 1 ? t : 1) : 0
  const dx = from.x + x * bestT - p.x
  const dy = from.y + y * bestT - p.y
  bestGap = dx * dx + dy * dy
}

/** Squared distance from a point to the box around a curve's controls: no point of the curve is nearer. */
const boxGap = (s: CubicSegment, p: Point): number => {
  const { from, control1, control2, to } = s
  const dx = Math.max(
    0,
    Math.min(from.x, control1.x, control2.x, to.x) - p.x,
    p.x - Math.max(from.x, control1.x, control2.x, to.x),
  )
  const dy = Math.max(
    0,
    Math.min(from.y, control1.y, control2.y, to.y) - p.y,
    p.y - Math.max(from.y, control1.y, control2.y, to.y),
  )
  return dx * dx + dy * dy
}

const SAMPLES = 16

/** Samples, then Newton on every sample that might lead below the best so far. */
const nearestOnCubic = (s: CubicSegment, p: Point, least: number): void => {
  const { from, control1, control2, to } = s
  const ax = to.x - from.x + 3 * (control1.x - control2.x)
  const ay = to.y - from.y + 3 * (control1.y - control2.y)
  const bx = 3 * (from.x - 2 * control1.x + control2.x)
  const by = 3 * (from.y - 2 * control1.y + control2.y)
  const cx = 3 * (control1.x - from.x)
  const cy = 3 * (control1.y - from.y)
  const ox = from.x - p.x
  const oy = from.y - p.y
  const gapAt = (t: number): number => {
    const x = ((ax * t + bx) * t + cx) * t + ox
    const y = ((ay * t + by) * t + cy) * t + oy
    return x * x + y * y
  }
  bestT = 0
  bestGap = ox * ox + oy * oy
  const end = gapAt(1)
  if (end < bestGap) {
    bestT = 1
    bestGap = end
  }
  // Between two samples the curve moves by no more than a third of this from the nearer one.
  const reach =
    Math.sqrt(
      Math.max(
        cx * cx + cy * cy,
        square(2 * bx + 3 * ax + cx, 2 * by + 3 * ay + cy),
        square(3 * (control2.x - control1.x), 3 * (control2.y - control1.y)),
      ),
    ) /
    (2 * SAMPLES)
  for (let i = 0; i <= SAMPLES; i++) {
    const t0 = i / SAMPLES
    const bound = Math.sqrt(gapAt(t0)) - reach
    if (bound > 0 && (bound * bound > bestGap || bound * bound > least)) continue
    let t = t0
    for (let n = 0; n < 12; n++) {
      const x = ((ax * t + bx) * t + cx) * t + ox
      const y = ((ay * t + by) * t + cy) * t + oy
      const vx = (3 * ax * t + 2 * bx) * t + cx
      const vy = (3 * ay * t + 2 * by) * t + cy
      const slope = x * vx + y * vy
      const speed = vx * vx + vy * vy
      const bend = speed + x * (6 * ax * t + 2 * bx) + y * (6 * ay * t + 2 * by)
      // Towards the minimum even where the distance curves the other way.
      const step = bend > 0.1 * speed ? slope / bend : speed > 0 ? slope / speed : 0
      const next = Math.min(1, Math.max(0, t - Math.min(0.1, Math.max(-0.1, step))))
      const done = Math.abs(next - t) < 1e-14
      t = next
      if (done) break
    }
    const gap = gapAt(t)
    if (gap < bestGap) {
      bestGap = gap
      bestT = t
    }
  }
}

const square = (x: number, y: number): number => x * x + y * y

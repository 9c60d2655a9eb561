import type { CubicSegment, LineSegment, Point, Segment } from '../contract'
import { lerp, magnitude, scale, subtract, unit } from './point'

export { parameterAt, segmentLength } from './length'

export const line = (from: Point, to: Point): LineSegment => ({ kind: 'line', from, to })

/** A cubic Bézier curve from its end points and controls. */
export const cubic = (from: Point, control1: Point, control2: Point, to: Point): CubicSegment => ({
  kind: 'cubic',
  from,
  control1,
  control2,
  to,
})

/** The point at parameter t (0…1); exactly the end points at 0 and 1. */
export const evaluate = (segment: Segment, t: number): Point => {
  if (t === 0) return segment.from
  if (t === 1) return segment.to
  if (segment.kind === 'line') return lerp(segment.from, segment.to, t)
  const { from, control1, control2, to } = segment
  const u = 1 - t
  const a = u * u * u
  const b = 3 * u * u * t
  const c = 3 * u * t * t
  const d = t * t * t
  return {
    x: a * from.x + b * control1.x + c * control2.x + d * to.x,
    y: a * from.y + b * control1.y + c * control2.y + d * to.y,
  }
}

/** First derivative by the parameter, mm per unit of t. */
export const derivative = (segment: Segment, t: number): Point => {
  if (segment.kind === 'line') return subtract(segment.to, segment.from)
  const { from, control1, control2, to } = segment
  const u = 1 - t
  const a = 3 * u * u
  const b = 6 * u * t
  const c = 3 * t * t
  return {
    x: a * (control1.x - from.x) + b * (control2.x - control1.x) + c * (to.x - control2.x),
    y: a * (control1.y - from.y) + b * (control2.y - control1.y) + c * (to.y - control2.y),
  }
}

/** Second derivative by the parameter; zero on a line. */
export const secondDerivative = (segment: Segment, t: number): Point => {
  if (segment.kind === 'line') return { x: 0, y: 0 }
  const { from, control1, control2, to } = segment
  const a = 6 * (1 - t)
  const b = 6 * t
  return {
    x: a * (from.x - 2 * control1.x + control2.x) + b * (control1.x - 2 * control2.x + to.x),
    y: a * (from.y - 2 * control1.y + control2.y) + b * (control1.y - 2 * control2.y + to.y),
  }
}

/** The two halves at t; they share the very same point. */
export const splitSegment = (segment: Segment, t: number): readonly [Segment, Segment] => {
  if (segment.kind === 'line') {
    const middle = evaluate(segment, t)
    return [line(segment.from, middle), line(middle, segment.to)]
  }
  const { from, control1, control2, to } = segment
  const a = lerp(from, control1, t)
  const b = lerp(control1, control2, t)
  const c = lerp(control2, to, t)
  const ab = lerp(a, b, t)
  const bc = lerp(b, c, t)
  const middle = t === 0 ? from : t === 1 ? to : lerp(ab, bc, t)
  return [cubic(from, a, ab, middle), cubic(middle, bc, c, to)]
}

/** The stretch from t0 to t1 (t0 ≤ t1); an end at 0 or 1 is the segment's own end point. */
export const sliceSegment = (segment: Segment, t0: number, t1: number): Segment => {
  if (t0 <= 0 && t1 >= 1) return segment
  const from = t0 <= 0 ? segment.from : t0 >= 1 ? segment.to : evaluate(segment, t0)
  const to = t1 >= 1 ? segment.to : t1 <= 0 ? segment.from : evaluate(segment, t1)
  if (segment.kind === 'line') return line(from, to)
  const third = (Math.min(1, t1) - Math.max(0, t0)) / 3
  const start = derivative(segment, t0 <= 0 ? 0 : t0)
  const end = derivative(segment, t1 >= 1 ? 1 : t1)
  return cubic(
    from,
    { x: from.x + start.x * third, y: from.y + start.y * third },
    { x: to.x - end.x * third, y: to.y - end.y * third },
    to,
  )
}

/** The same curve travelled the other way. */
export const reverseSegment = (segment: Segment): Segment =>
  segment.kind === 'line'
    ? line(segment.to, segment.from)
    : cubic(segment.to, segment.control2, segment.control1, segment.from)

/**
 * Direction of travel at parameter t as a unit vector. Where the curve stands still (a control on its end point, a cusp)
 * it is the direction in which it leaves or arrives.
 */
export const tangentAt = (segment: Segment, t: number): Point => {
  const v = derivative(segment, t)
  const speed = magnitude(v)
  if (speed > 1e-9) return { x: v.x / speed, y: v.y / speed }
  const ahead = t < 0.5
  const turn = secondDerivative(segment, t)
  const bend = magnitude(turn)
  if (bend > 1e-9) return scale(turn, (ahead ? 1 : -1) / bend)
  return unit(subtract(segment.to, segment.from))
}

import type { Path, Point, Segment } from '../contract'
import { towards } from './point'
import { cubic, line } from './segment'

/** An affine map: x' = a·x + c·y + e, y' = b·x + d·y + f. */
export interface Transform {
  readonly a: number
  readonly b: number
  readonly c: number
  readonly d: number
  readonly e: number
  readonly f: number
}

export const identity: Transform = { a: 1, b: 0, c: 0, d: 1, e: 0, f: 0 }

/** Moves by dx, dy in mm. */
export const translation = (dx: number, dy: number): Transform => ({ a: 1, b: 0, c: 0, d: 1, e: dx, f: dy })

/** Turns clockwise by so many degrees about a point. */
export const rotation = (degrees: number, about: Point): Transform => {
  const { x: c, y: s } = towards(degrees)
  return {
    a: c,
    b: s,
    c: -s,
    d: c,
    e: about.x - c * about.x + s * about.y,
    f: about.y - s * about.x - c * about.y,
  }
}

/** Mirrors in the centre line x = 0. */
export const mirrorX: Transform = { a: -1, b: 0, c: 0, d: 1, e: 0, f: 0 }

/** Mirrors in the line through two points; two equal points mirror in the horizontal through them. */
export const mirrorIn = (from: Point, to: Point): Transform => {
  const x = to.x - from.x
  const y = to.y - from.y
  const square = x * x + y * y
  const cos = square > 0 ? (x * x - y * y) / square : 1
  const sin = square > 0 ? (2 * x * y) / square : 0
  return {
    a: cos,
    b: sin,
    c: sin,
    d: -cos,
    e: from.x - cos * from.x - sin * from.y,
    f: from.y - sin * from.x + cos * from.y,
  }
}

/** The map that does b first and a after it. */
export const compose = (a: Transform, b: Transform): Transform => ({
  a: a.a * b.a + a.c * b.b,
  b: a.b * b.a + a.d * b.b,
  c: a.a * b.c + a.c * b.d,
  d: a.b * b.c + a.d * b.d,
  e: a.a * b.e + a.c * b.f + a.e,
  f: a.b * b.e + a.d * b.f + a.f,
})

/** The map that undoes a rigid one: turns, moves and mirrors. */
export const undo = ({ a, b, c, d, e, f }: Transform): Transform => ({
  a,
  b: c,
  c: b,
  d,
  e: -(a * e + b * f),
  f: -(c * e + d * f),
})

export const applyTo = (transform: Transform, point: Point): Point => ({
  x: transform.a * point.x + transform.c * point.y + transform.e,
  y: transform.b * point.x + transform.d * point.y + transform.f,
})

/** The path with every point mapped; equal coordinates map to equal coordinates, so joints and closedness stay exact. */
export const transformPath = (transform: Transform, path: Path): Path => {
  const mapped: Segment[] = []
  let end: Point | undefined
  for (const segment of path.segments) {
    const from: Point = end ?? applyTo(transform, segment.from)
    end = applyTo(transform, segment.to)
    mapped.push(
      segment.kind === 'line'
        ? line(from, end)
        : cubic(from, applyTo(transform, segment.control1), applyTo(transform, segment.control2), end),
    )
  }
  return { segments: mapped, closed: path.closed }
}

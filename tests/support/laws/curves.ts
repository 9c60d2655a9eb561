import type { Path, Point, Segment } from '@/drafting/contract'

/*
 * Measuring by a second hand: nothing here shares code with the engine, so that a fault there cannot hide itself.
 */

/** A place on a segment with its first and second derivative by t. */
export interface Place {
  readonly at: Point
  readonly slope: Point
  readonly bend: Point
}

/** By de Casteljau's construction. @param t 0…1 */
export function placeOn(segment: Segment, t: number): Place {
  if (segment.kind === 'line') {
    const slope = minus(segment.to, segment.from)
    return { at: mix(segment.from, segment.to, t), slope, bend: { x: 0, y: 0 } }
  }
  const { from, control1, control2, to } = segment
  const a = mix(from, control1, t)
  const b = mix(control1, control2, t)
  const c = mix(control2, to, t)
  const d = mix(a, b, t)
  const e = mix(b, c, t)
  const first = minus(e, d)
  const bent = { x: a.x - 2 * b.x + c.x, y: a.y - 2 * b.y + c.y }
  return {
    at: mix(d, e, t),
    slope: { x: 3 * first.x, y: 3 * first.y },
    bend: { x: 6 * bent.x, y: 6 * bent.y },
  }
}

export function mix(a: Point, b: Point, t: number): Point {
  return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t }
}

export function minus(a: Point, b: Point): Point {
  return { x: a.x - b.x, y: a.y - b.y }
}

export function far(a: Point, b: Point): number {
  return Math.hypot(a.x - b.x, a.y - b.y)
}

export function startOfPath(path: Path): Point {
  return first(path).from
}

export function endOfPath(path: Path): Point {
  return last(path).to
}

function first(path: Path): Segment {
  const segment = path.segments[0]
  if (!segment) throw new Error('A path without segments.')
  return segment
}

function last(path: Path): Segment {
  const segment = path.segments[path.segments.length - 1]
  if (!segment) throw new Error('A path without segments.')
  return segment
}

const straight = (value: Point): Point => {
  const long = Math.hypot(value.x, value.y)
  return { x: value.x / long, y: value.y / long }
}

/** Unit direction of travel where a path begins; a handle of no length is looked past. */
export function headingAtStart(path: Path): Point {
  const segment = first(path)
  for (const t of [0, 1e-6, 1e-3, 1]) {
    const { slope } = placeOn(segment, t)
    if (Math.hypot(slope.x, slope.y) > 1e-6) return straight(slope)
  }
  return { x: NaN, y: NaN }
}

/** Unit direction of travel where a path ends. */
export function headingAtEnd(path: Path): Point {
  const segment = last(path)
  for (const t of [1, 1 - 1e-6, 1 - 1e-3, 0]) {
    const { slope } = placeOn(segment, t)
    if (Math.hypot(slope.x, slope.y) > 1e-6) return straight(slope)
  }
  return { x: NaN, y: NaN }
}

/** Degrees from one direction to another, clockwise on the sheet, −180…180. */
export function turnFrom(a: Point, b: Point): number {
  return (Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y) * 180) / Math.PI
}

const panels = 128

/** Length of a path by Simpson's rule over its speed, mm. */
export function lengthOfPath(path: Path): number {
  return path.segments.reduce((sum, segment) => sum + lengthOfSegment(segment), 0)
}

function lengthOfSegment(segment: Segment): number {
  if (segment.kind === 'line') return far(segment.from, segment.to)
  const speed = (index: number): number => {
    const { slope } = placeOn(segment, index / panels)
    return Math.hypot(slope.x, slope.y)
  }
  let sum = speed(0) + speed(panels)
  for (let index = 1; index < panels; index += 1) sum += speed(index) * (index % 2 ? 4 : 2)
  return sum / (3 * panels)
}

/** Points along a path, both ends included, so near together that the chords lie within `tolerance` mm of it. */
export function chordsOf(path: Path, tolerance = 0.002): Point[] {
  const points: Point[] = [startOfPath(path)]
  for (const segment of path.segments) {
    if (segment.kind === 'line') points.push(segment.to)
    else halve(segment, tolerance, 0, points)
  }
  return points
}

function halve(segment: Segment & { kind: 'cubic' }, tolerance: number, depth: number, into: Point[]): void {
  const { from, control1, control2, to } = segment
  // How far a cubic leaves its chord is at most √3/9 of its second differences.
  const one = Math.hypot(from.x - 2 * control1.x + control2.x, from.y - 2 * control1.y + control2.y)
  const two = Math.hypot(control1.x - 2 * control2.x + to.x, control1.y - 2 * control2.y + to.y)
  if (depth >= 14 || Math.max(one, two) * 0.75 <= tolerance) {
    into.push(to)
    return
  }
  const a = mix(from, control1, 0.5)
  const b = mix(control1, control2, 0.5)
  const c = mix(control2, to, 0.5)
  const d = mix(a, b, 0.5)
  const e = mix(b, c, 0.5)
  const middle = mix(d, e, 0.5)
  halve({ kind: 'cubic', from, control1: a, control2: d, to: middle }, tolerance, depth + 1, into)
  halve({ kind: 'cubic', from: middle, control1: e, control2: c, to }, tolerance, depth + 1, into)
}

import type { Path, Point, Segment } from '../../../drafting/contract'

/*
 * A slow, plain second opinion: curves as thousands of short chords, distances by trying every chord. Shares no code with
 * the engine.
 */

/** Points along a path, at most `step` mm apart. */
export const dense = (path: Path, step = 0.25): Point[] => {
  const points: Point[] = []
  for (const segment of path.segments) {
    const count = Math.max(1, Math.ceil(hull(segment) / step))
    for (let i = points.length > 0 ? 1 : 0; i <= count; i++) points.push(bernstein(segment, i / count))
  }
  return points
}

const hull = (s: Segment): number => {
  const stops = s.kind === 'line' ? [s.from, s.to] : [s.from, s.control1, s.control2, s.to]
  let sum = 0
  for (let i = 1; i < stops.length; i++)
    sum += Math.hypot(stops[i]!.x - stops[i - 1]!.x, stops[i]!.y - stops[i - 1]!.y)
  return sum
}

const bernstein = (s: Segment, t: number): Point => {
  const u = 1 - t
  if (s.kind === 'line') return { x: u * s.from.x + t * s.to.x, y: u * s.from.y + t * s.to.y }
  const { from: a, control1: b, control2: c, to: d } = s
  return {
    x: u ** 3 * a.x + 3 * u * u * t * b.x + 3 * u * t * t * c.x + t ** 3 * d.x,
    y: u ** 3 * a.y + 3 * u * u * t * b.y + 3 * u * t * t * c.y + t ** 3 * d.y,
  }
}

/** Distance from a point to a polyline. */
export const gapTo = (points: readonly Point[], p: Point): number => {
  let least = Infinity
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1]!
    const b = points[i]!
    const x = b.x - a.x
    const y = b.y - a.y
    const square = x * x + y * y
    const t = square > 0 ? Math.min(1, Math.max(0, ((p.x - a.x) * x + (p.y - a.y) * y) / square)) : 0
    const gap = (a.x + x * t - p.x) ** 2 + (a.y + y * t - p.y) ** 2
    if (gap < least) least = gap
  }
  return Math.sqrt(least)
}

/** Length of a polyline. */
export const chordLength = (points: readonly Point[]): number => {
  let sum = 0
  for (let i = 1; i < points.length; i++)
    sum += Math.hypot(points[i]!.x - points[i - 1]!.x, points[i]!.y - points[i - 1]!.y)
  return sum
}

/** Σ(xᵢ·yᵢ₊₁ − xᵢ₊₁·yᵢ)/2 of a polygon. */
export const polygonArea = (points: readonly Point[]): number => {
  let sum = 0
  for (let i = 0; i < points.length; i++) {
    const a = points[i]!
    const b = points[(i + 1) % points.length]!
    sum += a.x * b.y - b.x * a.y
  }
  return sum / 2
}

/** Even–odd. */
export const polygonContains = (points: readonly Point[], p: Point): boolean => {
  let inside = false
  for (let i = 0, j = points.length - 1; i < points.length; j = i++) {
    const a = points[i]!
    const b = points[j]!
    if (a.y > p.y !== b.y > p.y && p.x < ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y) + a.x) inside = !inside
  }
  return inside
}

/** The parallel point of every dense point of a source, with the point it belongs to; both sides at a corner. */
export const parallelPoints = (path: Path, distance: number, step = 0.25): { at: Point; from: Point }[] => {
  const found: { at: Point; from: Point }[] = []
  for (const segment of path.segments) {
    const count = Math.max(1, Math.ceil(hull(segment) / step))
    for (let i = 0; i <= count; i++) {
      const t = i / count
      const a = bernstein(segment, Math.max(0, t - 1e-6))
      const b = bernstein(segment, Math.min(1, t + 1e-6))
      const along = Math.hypot(b.x - a.x, b.y - a.y)
      if (along < 1e-12) continue
      const from = bernstein(segment, t)
      found.push({
        from,
        at: { x: from.x + ((b.y - a.y) / along) * distance, y: from.y - ((b.x - a.x) / along) * distance },
      })
    }
  }
  return found
}

/** Whether no two stretches of a polygon that are not neighbours meet. */
export const polygonIsSimple = (points: readonly Point[]): boolean => {
  const n = points.length
  const cell = 2
  const grid = new Map<string, number[]>()
  const cellsOf = (i: number): string[] => {
    const a = points[i]!
    const b = points[(i + 1) % n]!
    const keys: string[] = []
    for (let x = Math.floor(Math.min(a.x, b.x) / cell); x <= Math.floor(Math.max(a.x, b.x) / cell); x++) {
      for (let y = Math.floor(Math.min(a.y, b.y) / cell); y <= Math.floor(Math.max(a.y, b.y) / cell); y++) {
        keys.push(`${x},${y}`)
      }
    }
    return keys
  }
  for (let i = 0; i < n; i++) {
    for (const key of cellsOf(i)) {
      const others = grid.get(key)
      if (!others) {
        grid.set(key, [i])
        continue
      }
      for (const j of others) {
        if (j === i || (i + 1) % n === j || (j + 1) % n === i) continue
        if (chordsCross(points[i]!, points[(i + 1) % n]!, points[j]!, points[(j + 1) % n]!)) return false
      }
      others.push(i)
    }
  }
  return true
}

const side = (a: Point, b: Point, c: Point): number => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)

const chordsCross = (a: Point, b: Point, c: Point, d: Point): boolean =>
  side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0

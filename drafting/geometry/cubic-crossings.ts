import type { CubicSegment } from '../contract'

/*
 * Where two cubics meet: both are halved as long as their boxes and fat lines overlap; as soon as they can cross only once,
 * Newton's method finishes. What is still undecided at a hundred-thousandth of a millimetre is a touching contact.
 */

const CONTACT = 1e-9
const SMALLEST = 1e-5
/** Curves that lie along one another would be halved for ever: beyond this many pairs the search stops. */
const MOST_PAIRS = 6000
const DEEPEST = 120

/** Control points of both curves at every depth: x0 y0 … x3 y3 of the one, then of the other. */
const pool = new Float64Array((DEEPEST + 1) * 16)
let pairs = 0
let meet: (t: number, u: number) => void
let first: CubicSegment
let second: CubicSegment

/** Calls back with the parameters of each meeting, in no particular order; a meeting on a halving may come twice. */
export const cubicCrossings = (
  a: CubicSegment,
  b: CubicSegment,
  found: (t: number, u: number) => void,
): void => {
  put(a, 0)
  put(b, 8)
  pairs = 0
  first = a
  second = b
  meet = found
  descend(0, 0, 1, 0, 1)
}

const put = (s: CubicSegment, at: number): void => {
  pool[at] = s.from.x
  pool[at + 1] = s.from.y
  pool[at + 2] = s.control1.x
  pool[at + 3] = s.control1.y
  pool[at + 4] = s.control2.x
  pool[at + 5] = s.control2.y
  pool[at + 6] = s.to.x
  pool[at + 7] = s.to.y
}

const descend = (depth: number, t0: number, t1: number, u0: number, u1: number): void => {
  const a = depth * 16
  const b = a + 8
  if (++pairs > MOST_PAIRS || apart(a, b, 0) || apart(a, b, 1) || besideChord(a, b) || besideChord(b, a))
    return
  const sizeA = size(a)
  const sizeB = size(b)
  if ((sizeA <= SMALLEST && sizeB <= SMALLEST) || depth === DEEPEST) return polish(t0, t1, u0, u1, false)
  if (crossOnce(a, b)) return polish(t0, t1, u0, u1, true)
  const next = a + 16
  if (sizeA >= sizeB) {
    const t = (t0 + t1) / 2
    keep(b, next + 8)
    halve(a, next, true)
    descend(depth + 1, t0, t, u0, u1)
    keep(b, next + 8)
    halve(a, next, false)
    descend(depth + 1, t, t1, u0, u1)
  } else {
    const u = (u0 + u1) / 2
    keep(a, next)
    halve(b, next + 8, true)
    descend(depth + 1, t0, t1, u0, u)
    keep(a, next)
    halve(b, next + 8, false)
    descend(depth + 1, t0, t1, u, u1)
  }
}

const apart = (a: number, b: number, axis: number): boolean => {
  const a0 = pool[a + axis]!
  const a1 = pool[a + 2 + axis]!
  const a2 = pool[a + 4 + axis]!
  const a3 = pool[a + 6 + axis]!
  const b0 = pool[b + axis]!
  const b1 = pool[b + 2 + axis]!
  const b2 = pool[b + 4 + axis]!
  const b3 = pool[b + 6 + axis]!
  return (
    Math.min(a0, a1, a2, a3) > Math.max(b0, b1, b2, b3) + CONTACT ||
    Math.min(b0, b1, b2, b3) > Math.max(a0, a1, a2, a3) + CONTACT
  )
}

/** Whether the second curve lies wholly to one side of the strip along the first one's chord. */
const besideChord = (a: number, b: number): boolean => {
  const x = pool[a]!
  const y = pool[a + 1]!
  let nx = y - pool[a + 7]!
  let ny = pool[a + 6]! - x
  const length = Math.sqrt(nx * nx + ny * ny)
  if (length < 1e-12) return false
  nx /= length
  ny /= length
  const p = (pool[a + 2]! - x) * nx + (pool[a + 3]! - y) * ny
  const q = (pool[a + 4]! - x) * nx + (pool[a + 5]! - y) * ny
  const low = Math.min(0, p, q) - CONTACT
  const high = Math.max(0, p, q) + CONTACT
  const d0 = (pool[b]! - x) * nx + (pool[b + 1]! - y) * ny
  const d1 = (pool[b + 2]! - x) * nx + (pool[b + 3]! - y) * ny
  const d2 = (pool[b + 4]! - x) * nx + (pool[b + 5]! - y) * ny
  const d3 = (pool[b + 6]! - x) * nx + (pool[b + 7]! - y) * ny
  return Math.min(d0, d1, d2, d3) > high || Math.max(d0, d1, d2, d3) < low
}

const size = (a: number): number => {
  const x = Math.max(pool[a]!, pool[a + 2]!, pool[a + 4]!, pool[a + 6]!)
  const y = Math.max(pool[a + 1]!, pool[a + 3]!, pool[a + 5]!, pool[a + 7]!)
  const left = Math.min(pool[a]!, pool[a + 2]!, pool[a + 4]!, pool[a + 6]!)
  const top = Math.min(pool[a + 1]!, pool[a + 3]!, pool[a + 5]!, pool[a + 7]!)
  return Math.max(x - left, y - top)
}

/** Sine of the widest angle between a curve's control legs and its chord; 1 when that says nothing. */
const spread = (a: number): number => {
  const x = pool[a + 6]! - pool[a]!
  const y = pool[a + 7]! - pool[a + 1]!
  const chord = Math.sqrt(x * x + y * y)
  let widest = 0
  for (let i = 0; i < 6; i += 2) {
    const lx = pool[a + i + 2]! - pool[a + i]!
    const ly = pool[a + i + 3]! - pool[a + i + 1]!
    const leg = Math.sqrt(lx * lx + ly * ly)
    if (leg < 1e-12 || lx * x + ly * y <= 0) return 1
    const sine = Math.abs(lx * y - ly * x) / (leg * chord)
    if (sine > widest) widest = sine
  }
  return widest
}

/** Two curves whose directions never agree cross at most once. */
const crossOnce = (a: number, b: number): boolean => {
  const limit = spread(a) + spread(b)
  if (limit > 0.7) return false
  const ax = pool[a + 6]! - pool[a]!
  const ay = pool[a + 7]! - pool[a + 1]!
  const bx = pool[b + 6]! - pool[b]!
  const by = pool[b + 7]! - pool[b + 1]!
  const between = Math.abs(ax * by - ay * bx) / Math.sqrt((ax * ax + ay * ay) * (bx * bx + by * by))
  return between > 1.2 * limit
}

const keep = (from: number, to: number): void => {
  for (let i = 0; i < 8; i++) pool[to + i] = pool[from + i]!
}

/** Splits the curve at `from` at its middle and puts one half at `to`. */
const halve = (from: number, to: number, lower: boolean): void => {
  for (let axis = 0; axis < 2; axis++) {
    const p0 = pool[from + axis]!
    const p1 = pool[from + 2 + axis]!
    const p2 = pool[from + 4 + axis]!
    const p3 = pool[from + 6 + axis]!
    const a = (p0 + p1) / 2
    const b = (p1 + p2) / 2
    const c = (p2 + p3) / 2
    const ab = (a + b) / 2
    const bc = (b + c) / 2
    const middle = (ab + bc) / 2
    pool[to + axis] = lower ? p0 : middle
    pool[to + 2 + axis] = lower ? a : bc
    pool[to + 4 + axis] = lower ? ab : c
    pool[to + 6 + axis] = lower ? middle : p3
  }
}

/**
 * Newton's method on the original curves from the middle of a pair of stretches. A single crossing must end within them; a
 * touching contact is reported where it was found.
 */
const polish = (t0: number, t1: number, u0: number, u1: number, single: boolean): void => {
  let t = (t0 + t1) / 2
  let u = (u0 + u1) / 2
  const a = first
  const b = second
  const slackT = 1e-9 + 0.01 * (t1 - t0)
  const slackU = 1e-9 + 0.01 * (u1 - u0)
  for (let n = 0; n < 20; n++) {
    const s = 1 - t
    const v = 1 - u
    const gx =
      at(a.from.x, a.control1.x, a.control2.x, a.to.x, s, t) -
      at(b.from.x, b.control1.x, b.control2.x, b.to.x, v, u)
    const gy =
      at(a.from.y, a.control1.y, a.control2.y, a.to.y, s, t) -
      at(b.from.y, b.control1.y, b.control2.y, b.to.y, v, u)
    const ax = slope(a.from.x, a.control1.x, a.control2.x, a.to.x, s, t)
    const ay = slope(a.from.y, a.control1.y, a.control2.y, a.to.y, s, t)
    const bx = slope(b.from.x, b.control1.x, b.control2.x, b.to.x, v, u)
    const by = slope(b.from.y, b.control1.y, b.control2.y, b.to.y, v, u)
    const turn = ay * bx - ax * by
    if (Math.abs(turn) < 1e-14 * (Math.abs(ax * bx) + Math.abs(ay * by)) || turn === 0) break
    const dt = (gx * by - gy * bx) / turn
    const du = (gx * ay - gy * ax) / turn
    // Kept near the stretches: a far step would find another crossing.
    t = Math.min(t1 + slackT, Math.max(t0 - slackT, t + dt))
    u = Math.min(u1 + slackU, Math.max(u0 - slackU, u + du))
    if (Math.abs(dt) < 1e-15 && Math.abs(du) < 1e-15) break
  }
  const edge = 1e-12
  const tt = t < edge ? 0 : t > 1 - edge ? 1 : t
  const uu = u < edge ? 0 : u > 1 - edge ? 1 : u
  if (single && (t < t0 - 1e-11 || t > t1 + 1e-11 || u < u0 - 1e-11 || u > u1 + 1e-11) && !near(tt, uu))
    return
  const x =
    at(a.from.x, a.control1.x, a.control2.x, a.to.x, 1 - tt, tt) -
    at(b.from.x, b.control1.x, b.control2.x, b.to.x, 1 - uu, uu)
  const y =
    at(a.from.y, a.control1.y, a.control2.y, a.to.y, 1 - tt, tt) -
    at(b.from.y, b.control1.y, b.control2.y, b.to.y, 1 - uu, uu)
  if (x * x + y * y <= (single ? 1e-16 : 1e-12)) meet(tt, uu)
}

const near = (t: number, u: number): boolean => t >= 0 && t <= 1 && u >= 0 && u <= 1

const at = (p0: number, p1: number, p2: number, p3: number, s: number, t: number): number =>
  s * s * s * p0 + 3 * s * s * t * p1 + 3 * s * t * t * p2 + t * t * t * p3

const slope = (p0: number, p1: number, p2: number, p3: number, s: number, t: number): number =>
  3 * (s * s * (p1 - p0) + 2 * s * t * (p2 - p1) + t * t * (p3 - p2))

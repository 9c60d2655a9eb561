import type { CubicSegment, Segment } from '../contract'

/*
 * Arc length by Gauss–Legendre quadrature. The speed of a cubic is the square root of a polynomial whose complex zeros are
 * known in closed form; how far they lie from an interval says beforehand how many nodes that interval needs, so there is
 * no comparing of two estimates that may agree by accident near a cusp.
 */

// Positive nodes and their weights, 8 and 16 points.
const NODES_8 = Float64Array.from([
  0.1834346424956498, 0.525532409916329, 0.7966664774136268, 0.9602898564975363,
])
const WEIGHTS_8 = Float64Array.from([
  0.362683783378362, 0.3137066458778874, 0.22238103445337445, 0.10122853629037618,
])
const NODES_16 = Float64Array.from([
  0.09501250983763744, 0.2816035507792589, 0.45801677765722737, 0.6178762444026438, 0.755404408355003,
  0.8656312023878318, 0.9445750230732326, 0.9894009349916499,
])
const WEIGHTS_16 = Float64Array.from([
  0.18945061045506847, 0.1826034150449236, 0.16915651939500256, 0.14959598881657682, 0.12462897125553395,
  0.0951585116824929, 0.062253523938647776, 0.027152459411754058,
])

/** Sum of the distances from a zero to the ends of an interval, over its width: beyond these the rule is exact to 1e-10. */
const ENOUGH_FOR_8 = 1.9
const ENOUGH_FOR_16 = 1.2
const DEEPEST = 30

// Velocity a·t² + b·t + c of the curve being measured, and the two complex zeros of its speed. Module state instead of
// arguments: the engine is single-threaded and these loops run thousands of times a redraw.
let ax = 0
let ay = 0
let bx = 0
let by = 0
let cx = 0
let cy = 0
let r1 = 0
let i1 = 0
let r2 = 0
let i2 = 0

const load = (s: CubicSegment): void => {
  const { from, control1, control2, to } = s
  cx = 3 * (control1.x - from.x)
  cy = 3 * (control1.y - from.y)
  const mx = 3 * (control2.x - control1.x)
  const my = 3 * (control2.y - control1.y)
  bx = 2 * (mx - cx)
  by = 2 * (my - cy)
  ax = cx - 2 * mx + 3 * (to.x - control2.x)
  ay = cy - 2 * my + 3 * (to.y - control2.y)
}

/** Zeros of (ax + i·ay)t² + (bx + i·by)t + (cx + i·cy); a zero at infinity stands far away. */
const findZeros = (): void => {
  const dx = bx * bx - by * by - 4 * (ax * cx - ay * cy)
  const dy = 2 * bx * by - 4 * (ax * cy + ay * cx)
  const size = Math.sqrt(dx * dx + dy * dy)
  let sx = Math.sqrt(Math.max(0, (size + dx) / 2))
  let sy = Math.sqrt(Math.max(0, (size - dx) / 2))
  if (dy < 0) sy = -sy
  // q = −(b + √d)/2 with the sign that does not cancel; the zeros are q/a and c/q.
  if (bx * sx + by * sy < 0) {
    sx = -sx
    sy = -sy
  }
  const qx = -(bx + sx) / 2
  const qy = -(by + sy) / 2
  const aa = ax * ax + ay * ay
  const qq = qx * qx + qy * qy
  if (qq > 1e12 * aa || aa === 0) {
    r1 = 1e6
    i1 = 0
  } else {
    r1 = (qx * ax + qy * ay) / aa
    i1 = (qy * ax - qx * ay) / aa
  }
  if (qq === 0) {
    r2 = cx * cx + cy * cy === 0 && aa > 0 ? 0 : 1e6
    i2 = 0
  } else {
    r2 = (cx * qx + cy * qy) / qq
    i2 = (cy * qx - cx * qy) / qq
  }
}

const integrate = (t0: number, t1: number, nodes: Float64Array, weights: Float64Array): number => {
  const half = (t1 - t0) / 2
  const middle = (t0 + t1) / 2
  let sum = 0
  for (let i = 0; i < nodes.length; i++) {
    const step = half * nodes[i]!
    const t = middle + step
    const u = middle - step
    const tx = (ax * t + bx) * t + cx
    const ty = (ay * t + by) * t + cy
    const ux = (ax * u + bx) * u + cx
    const uy = (ay * u + by) * u + cy
    sum += weights[i]! * (Math.sqrt(tx * tx + ty * ty) + Math.sqrt(ux * ux + uy * uy))
  }
  return sum * half
}

/** How far a zero is from an interval: the sum of distances to its ends over its width. */
const clearance = (r: number, i: number, t0: number, t1: number): number => {
  const width = t1 - t0
  // A true cusp at an end: the speed is smooth on either side of it.
  if (i < 1e-9 && i > -1e-9 && (Math.abs(r - t0) <= 1e-9 * width || Math.abs(r - t1) <= 1e-9 * width))
    return 9
  const a = r - t0
  const b = r - t1
  return (Math.sqrt(a * a + i * i) + Math.sqrt(b * b + i * i)) / width
}

/** Length of the loaded curve between two parameters, t0 < t1. */
const measure = (t0: number, t1: number, depth: number): number => {
  const first = clearance(r1, i1, t0, t1)
  const second = clearance(r2, i2, t0, t1)
  const least = first < second ? first : second
  // Written so that what is no number comes back as no number instead of being halved for ever.
  if (!(least < ENOUGH_FOR_8)) return integrate(t0, t1, NODES_8, WEIGHTS_8)
  if (least >= ENOUGH_FOR_16 || depth === 0) return integrate(t0, t1, NODES_16, WEIGHTS_16)
  const r = first < second ? r1 : r2
  const width = t1 - t0
  // Split at the cusp itself, else in the middle.
  const cut = r > t0 + 0.01 * width && r < t1 - 0.01 * width ? r : (t0 + t1) / 2
  return measure(t0, cut, depth - 1) + measure(cut, t1, depth - 1)
}

/** Length in mm, to 1e-6 mm or better. */
export const segmentLength = (segment: Segment): number => {
  if (segment.kind === 'line') {
    const x = segment.to.x - segment.from.x
    const y = segment.to.y - segment.from.y
    return Math.sqrt(x * x + y * y)
  }
  load(segment)
  findZeros()
  return measure(0, 1, DEEPEST)
}

/** Length in mm from the start to parameter t (0…1). */
export const lengthTo = (segment: Segment, t: number): number => {
  if (t <= 0) return 0
  if (t >= 1) return segmentLength(segment)
  if (segment.kind === 'line') return segmentLength(segment) * t
  load(segment)
  findZeros()
  return measure(0, t, DEEPEST)
}

/** Equal steps of the parameter, for each of which the length so far and the speed are kept: where a search starts. */
const STEPS = 4
/** A table holds the lengths, then the speeds, then the two zeros of the speed. */
const SPEEDS = STEPS + 1
const ZEROS = SPEEDS + STEPS + 1
const SIZE = ZEROS + 4
/** The last few curves asked about: a draft asks for several places on one and then never more. */
const KEPT = 16
const tables = new Float64Array(KEPT * SIZE)
const keys: (CubicSegment | undefined)[] = new Array<CubicSegment | undefined>(KEPT).fill(undefined)
let oldest = 0

/** Loads a curve and answers where its table starts. */
const loadWithTable = (segment: CubicSegment): number => {
  load(segment)
  for (let k = 0; k < KEPT; k++) {
    if (keys[k] !== segment) continue
    const at = k * SIZE
    r1 = tables[at + ZEROS]!
    i1 = tables[at + ZEROS + 1]!
    r2 = tables[at + ZEROS + 2]!
    i2 = tables[at + ZEROS + 3]!
    return at
  }
  const at = oldest * SIZE
  keys[oldest] = segment
  oldest = (oldest + 1) % KEPT
  findZeros()
  tables[at + ZEROS] = r1
  tables[at + ZEROS + 1] = i1
  tables[at + ZEROS + 2] = r2
  tables[at + ZEROS + 3] = i2
  let sum = 0
  tables[at] = 0
  for (let i = 1; i <= STEPS; i++) tables[at + i] = sum += measure((i - 1) / STEPS, i / STEPS, DEEPEST)
  for (let i = 0; i <= STEPS; i++) tables[at + SPEEDS + i] = speedAt(i / STEPS)
  return at
}

const speedAt = (t: number): number => {
  const x = (ax * t + bx) * t + cx
  const y = (ay * t + by) * t + cy
  return Math.sqrt(x * x + y * y)
}

/**
 * The parameter at a distance in mm along a segment; 0 before its start, 1 past its end.
 * Newton steps kept inside a bracket, so that a cusp cannot throw it.
 */
export const parameterAt = (segment: Segment, distance: number): number => {
  if (!(distance > 0)) return 0
  if (segment.kind === 'line') {
    const whole = segmentLength(segment)
    return distance >= whole ? 1 : distance / whole
  }
  const table = loadWithTable(segment)
  if (distance >= tables[table + STEPS]!) return 1
  let i = 0
  while (tables[table + i + 1]! <= distance) i++
  const at = table + i
  const speeds = at + SPEEDS
  return solve(i / STEPS, tables[at]!, tables[at + 1]!, tables[speeds]!, tables[speeds + 1]!, distance)
}

/** The parameter by the lengths and speeds at both ends of its step: a cubic through the inverse of the length. */
const guess = (share: number, width: number, length: number, speed: number, next: number): number => {
  const steepest = (3 * width) / length
  const m0 = speed * steepest > 1 ? 1 / speed : steepest
  const m1 = next * steepest > 1 ? 1 / next : steepest
  const rest = 1 - share
  return share * share * (3 - 2 * share) * width + share * rest * length * (rest * m0 - share * m1)
}

const solve = (
  from: number,
  before: number,
  after: number,
  speedBefore: number,
  speedAfter: number,
  distance: number,
): number => {
  const to = from + 1 / STEPS
  const length = after - before
  const slow = 0.2 * length * STEPS
  let low = from
  let high = to
  let t = from + guess((distance - before) / length, 1 / STEPS, length, speedBefore, speedAfter)
  // Length is measured from the last accepted parameter on, so that each step integrates a shorter stretch.
  let base = from
  let reached = before
  for (let n = 0; n < 60; n++) {
    if (t > base) reached += measure(base, t, DEEPEST)
    else if (t < base) reached -= measure(t, base, DEEPEST)
    base = t
    const miss = reached - distance
    if (miss > 0) high = t
    else low = t
    // Second order: the speed at the middle of the step stands for the whole of it.
    const speed = speedAt(t)
    const middle = t - miss / (2 * speed)
    const next = middle > from && middle < to ? t - miss / speedAt(middle) : t
    const sound = next >= low && next <= high
    if (Math.abs(miss) < 1e-9 || (Math.abs(miss) < 1e-3 && speed > slow && sound)) return sound ? next : t
    t = sound && next !== t ? next : (low + high) / 2
    if (high - low < 1e-15) return t
  }
  return t
}

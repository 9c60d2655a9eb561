import type { CubicSegment, Point, Segment } from '../contract'
import { cubic } from './segment'

/*
 * A parallel curve to one cubic, as few cubics as keep within the tolerance. Each is a Hermite fit: its ends and directions
 * are exact, its handles are the source's scaled by 1 + curvature × distance (which is how fast the parallel point moves)
 * and then a little more, so that the middle is exact too.
 */

/** mm; checked at five places, the true worst lies a little higher. */
const TOLERANCE = 0.012
/** A parallel curve that moves slower than this share of its source is on the brink of turning back. */
const BRINK = 1e-3
const DEEPEST = 6
/** Share by which a handle may be lengthened or shortened to meet the middle. */
const MOST_CHANGE = 0.3

/** Bernstein weights where a fit is checked beside its middle. */
const CHECKS = [0.14, 0.29, 0.71, 0.86].map((t) => {
  const u = 1 - t
  return { t, a: u * u * u + 3 * u * u * t, b: 3 * u * t * t + t * t * t, c: 3 * u * u * t, d: 3 * u * t * t }
})

// Source in power form, the distance, and the last parallel point found; single-threaded module state keeps the loop free
// of allocation.
let ax = 0
let ay = 0
let bx = 0
let by = 0
let cx = 0
let cy = 0
let px = 0
let py = 0
let distance = 0
let qx = 0
let qy = 0
let vx = 0
let vy = 0
let nx = 0
let ny = 0
let factor = 1
let bend = 0

let out: { push(piece: CubicSegment): unknown } = []
let turnsBack = false
let careful = false

const load = (s: CubicSegment, aside: number): void => {
  const { from, control1, control2, to } = s
  px = from.x
  py = from.y
  cx = 3 * (control1.x - px)
  cy = 3 * (control1.y - py)
  bx = 3 * (px - 2 * control1.x + control2.x)
  by = 3 * (py - 2 * control1.y + control2.y)
  ax = to.x - px + 3 * (control1.x - control2.x)
  ay = to.y - py + 3 * (control1.y - control2.y)
  distance = aside
}

/** Sets the parallel point (q), its velocity (v), the unit normal (n), the speed factor and the source's curvature at t. */
const locate = (t: number): void => {
  const x = (3 * ax * t + 2 * bx) * t + cx
  const y = (3 * ay * t + 2 * by) * t + cy
  const wx = 6 * ax * t + 2 * bx
  const wy = 6 * ay * t + 2 * by
  const speed2 = x * x + y * y
  if (speed2 > 1e-12) {
    const speed = Math.sqrt(speed2)
    bend = (x * wy - y * wx) / (speed2 * speed)
    factor = 1 + bend * distance
    nx = y / speed
    ny = -x / speed
    vx = x * factor
    vy = y * factor
  } else stationary(t, wx, wy)
  qx = ((ax * t + bx) * t + cx) * t + px + nx * distance
  qy = ((ay * t + by) * t + cy) * t + py + ny * distance
}

/** The limit where the source stands still (a control on its end point): it turns at a finite rate nevertheless. */
const stationary = (t: number, wx: number, wy: number): void => {
  const w2 = wx * wx + wy * wy
  const w = Math.sqrt(w2)
  const sign = t < 0.5 ? 1 : -1
  const tx = w > 1e-9 ? (sign * wx) / w : unitX()
  const ty = w > 1e-9 ? (sign * wy) / w : unitY()
  const rate = w > 1e-9 ? (3 * (wx * ay - wy * ax)) / w2 : 0
  nx = ty
  ny = -tx
  bend = 0
  factor = rate * distance >= 0 ? 1 : 0
  vx = tx * rate * distance
  vy = ty * rate * distance
}

const unitX = (): number => (chord() > 0 ? (ax + bx + cx) / chord() : 1)
const unitY = (): number => (chord() > 0 ? (ay + by + cy) / chord() : 0)
const chord = (): number => Math.hypot(ax + bx + cx, ay + by + cy)

/**
 * Appends the parallel of a cubic to `into`, starting at the very point `from` when one is given. Positive distance (mm) =
 * to the left of travel. Answers false, having appended nothing, where the curve is tighter than the distance: the parallel
 * would turn back there.
 */
export const offsetCubic = (
  s: CubicSegment,
  aside: number,
  from: Point | undefined,
  into: Segment[],
): boolean => {
  load(s, aside)
  const before = into.length
  out = into
  careful = false
  turnsBack = false
  stretch(0, 1, from)
  if (turnsBack) into.length = before
  return !turnsBack
}

/** Parallel stretches between the places where it turns back, for a curve that is tighter than the distance. */
export const offsetTightCubic = (s: CubicSegment, aside: number): CubicSegment[][] => {
  load(s, aside)
  const runs: CubicSegment[][] = []
  const steps = 64
  let start = -1
  let last = 0
  for (let i = 0; i <= steps; i++) {
    const t = i / steps
    const forward = moves(t)
    if (forward && start < 0) start = i === 0 ? 0 : turning(last, t)
    if (start >= 0 && (!forward || i === steps)) {
      const run: CubicSegment[] = []
      out = run
      careful = true
      turnsBack = false
      stretch(start, forward ? 1 : turning(last, t), undefined)
      runs.push(run)
      start = -1
    }
    last = t
  }
  return runs
}

const moves = (t: number): boolean => {
  locate(t)
  return factor > 0
}

/** Where between two parameters the parallel starts or stops turning back. */
const turning = (from: number, to: number): number => {
  const before = moves(from)
  let low = from
  let high = to
  for (let i = 0; i < 40; i++) {
    const t = (low + high) / 2
    if (moves(t) === before) low = t
    else high = t
  }
  return before ? low : high
}

const stretch = (t0: number, t1: number, from: Point | undefined): void => {
  locate(t0)
  if (!careful && factor < BRINK) {
    turnsBack = true
    return
  }
  const start = from ?? { x: qx, y: qy }
  const startVx = vx
  const startVy = vy
  locate(t1)
  if (!careful && factor < BRINK) {
    turnsBack = true
    return
  }
  fit(t0, start, startVx, startVy, t1, { x: qx, y: qy }, vx, vy, DEEPEST)
}

const fit = (
  t0: number,
  from: Point,
  v0x: number,
  v0y: number,
  t1: number,
  to: Point,
  v1x: number,
  v1y: number,
  depth: number,
): void => {
  const width = t1 - t0
  const third = width / 3
  let h0x = v0x * third
  let h0y = v0y * third
  let h1x = v1x * third
  let h1y = v1y * third
  locate(t0 + width / 2)
  if (factor < BRINK && !careful) {
    turnsBack = true
    return
  }
  let worst = 0
  const missX = (from.x + to.x) / 2 + 0.375 * (h0x - h1x) - qx
  const missY = (from.y + to.y) / 2 + 0.375 * (h0y - h1y) - qy
  const miss = missX * nx + missY * ny
  // What lengthening each handle moves the middle aside; the least change that takes the miss away.
  const first = 0.375 * (h0x * nx + h0y * ny)
  const second = -0.375 * (h1x * nx + h1y * ny)
  const change = -miss / (first * first + second * second)
  const a = change * first
  const b = change * second
  if (Math.abs(a) < MOST_CHANGE && Math.abs(b) < MOST_CHANGE) {
    h0x *= 1 + a
    h0y *= 1 + a
    h1x *= 1 + b
    h1y *= 1 + b
  } else worst = Math.abs(miss)
  for (let k = 0; k < 4; k++) {
    const check = CHECKS[k]!
    locate(t0 + width * check.t)
    if (factor < BRINK && !careful) {
      turnsBack = true
      return
    }
    const ex = check.a * from.x + check.b * to.x + check.c * h0x - check.d * h1x - qx
    const ey = check.a * from.y + check.b * to.y + check.c * h0y - check.d * h1y - qy
    // A slip along the curve only counts by how much the curve bends over it.
    const across = Math.abs(ex * nx + ey * ny)
    const along = ex * ny - ey * nx
    const gap = across + (along * along * Math.abs(bend)) / Math.max(2 * factor, 0.1)
    if (gap > worst) worst = gap
  }
  if (worst <= TOLERANCE || depth === 0) {
    out.push(cubic(from, { x: from.x + h0x, y: from.y + h0y }, { x: to.x - h1x, y: to.y - h1y }, to))
    return
  }
  // The error falls with about the fifth power of the width: that says how many parts to cut it into.
  const parts = Math.min(6, Math.max(2, Math.ceil((worst / TOLERANCE) ** 0.2)))
  let t = t0
  let at = from
  let x = v0x
  let y = v0y
  for (let i = 1; i <= parts; i++) {
    if (i === parts) {
      fit(t, at, x, y, t1, to, v1x, v1y, depth - 1)
      return
    }
    const next = t0 + (width * i) / parts
    locate(next)
    const end = { x: qx, y: qy }
    const endVx = vx
    const endVy = vy
    fit(t, at, x, y, next, end, endVx, endVy, depth - 1)
    if (turnsBack) return
    t = next
    at = end
    x = endVx
    y = endVy
  }
}

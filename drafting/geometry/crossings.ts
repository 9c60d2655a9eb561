import type { CubicSegment, LineSegment, Point, Segment } from '../contract'
import { cubicCrossings } from './cubic-crossings'
import { evaluate } from './segment'

/** Places closer than this (mm) are one contact. */
const CONTACT = 1e-9

/** Called with the parameter on each of two segments where they meet. */
export type Meeting = (t: number, u: number) => void

/**
 * Every place where two segments meet, end points and tangential contact included. Segments lying along one another report
 * the ends of the shared stretch.
 */
export const crossings = (a: Segment, b: Segment, meet: Meeting): void => {
  if (a.kind === 'line') {
    if (b.kind === 'line') lines(a, b, meet)
    else lineAndCubic(a, b, meet)
  } else if (b.kind === 'line') lineAndCubic(b, a, (u, t) => meet(t, u))
  else cubicCrossings(a, b, meet)
}

const clamp = (t: number): number => (t <= 0 ? 0 : t >= 1 ? 1 : t)

const lines = (a: LineSegment, b: LineSegment, meet: Meeting): void => {
  const ax = a.to.x - a.from.x
  const ay = a.to.y - a.from.y
  const bx = b.to.x - b.from.x
  const by = b.to.y - b.from.y
  const ox = b.from.x - a.from.x
  const oy = b.from.y - a.from.y
  const la = Math.sqrt(ax * ax + ay * ay)
  const lb = Math.sqrt(bx * bx + by * by)
  if (la <= CONTACT) return ends(b, [a.from], (u) => meet(0, u))
  if (lb <= CONTACT) return ends(a, [b.from], (t) => meet(t, 0))
  const turn = ax * by - ay * bx
  if (Math.abs(turn) > 1e-12 * la * lb) {
    const t = (ox * by - oy * bx) / turn
    const u = (ox * ay - oy * ax) / turn
    if (t >= -CONTACT / la && t <= 1 + CONTACT / la && u >= -CONTACT / lb && u <= 1 + CONTACT / lb) {
      meet(clamp(t), clamp(u))
    }
    return
  }
  if (Math.abs(ox * ay - oy * ax) > CONTACT * la) return
  ends(a, [b.from, b.to], (t, which) => meet(t, which))
  ends(b, [a.from, a.to], (u, which) => meet(which, u))
}

/** Which of the points lie on a segment, with the parameter there and the number of the point. */
const ends = (
  segment: LineSegment,
  points: readonly Point[],
  found: (t: number, index: number) => void,
): void => {
  const x = segment.to.x - segment.from.x
  const y = segment.to.y - segment.from.y
  const square = x * x + y * y
  points.forEach((p, index) => {
    const t = square > 0 ? clamp(((p.x - segment.from.x) * x + (p.y - segment.from.y) * y) / square) : 0
    const at = evaluate(segment, t)
    if (Math.abs(at.x - p.x) <= CONTACT && Math.abs(at.y - p.y) <= CONTACT) found(t, index)
  })
}

/** The cubic's distance from the line is a cubic in t: its zeros are the meetings. */
const lineAndCubic = (a: LineSegment, b: CubicSegment, meet: Meeting): void => {
  const x = a.to.x - a.from.x
  const y = a.to.y - a.from.y
  const length = Math.sqrt(x * x + y * y)
  if (length <= CONTACT) return
  const nx = -y / length
  const ny = x / length
  const d0 = (b.from.x - a.from.x) * nx + (b.from.y - a.from.y) * ny
  const d1 = (b.control1.x - a.from.x) * nx + (b.control1.y - a.from.y) * ny
  const d2 = (b.control2.x - a.from.x) * nx + (b.control2.y - a.from.y) * ny
  const d3 = (b.to.x - a.from.x) * nx + (b.to.y - a.from.y) * ny
  const low = Math.min(d0, d1, d2, d3)
  const high = Math.max(d0, d1, d2, d3)
  if (low > CONTACT || high < -CONTACT) return
  const check = (u: number): void => {
    const p = evaluate(b, u)
    const along = ((p.x - a.from.x) * x + (p.y - a.from.y) * y) / length
    if (along >= -CONTACT && along <= length + CONTACT) meet(clamp(along / length), u)
  }
  if (high - low <= CONTACT) {
    for (const [t, p] of [
      [0, a.from],
      [1, a.to],
    ] as const) {
      for (const u of [0, 1]) {
        const q = evaluate(b, u)
        if (Math.abs(q.x - p.x) <= CONTACT && Math.abs(q.y - p.y) <= CONTACT) meet(t, u)
      }
    }
    check(0)
    check(1)
    return
  }
  zeros(d0, d1, d2, d3, check)
}

/** Zeros in 0…1 of a cubic by its Bernstein coefficients (mm), touching ones within the contact tolerance included. */
export const zeros = (d0: number, d1: number, d2: number, d3: number, found: (t: number) => void): void => {
  const c = 3 * (d1 - d0)
  const b = 3 * (d0 - 2 * d1 + d2)
  const a = d3 - d0 + 3 * (d1 - d2)
  const at = (t: number): number => (t === 1 ? d3 : ((a * t + b) * t + c) * t + d0)
  // Between two turning points the value only rises or only falls.
  let t1 = 1
  let t2 = 1
  const disc = b * b - 3 * a * c
  if (disc > 0) {
    const q = -(b + (b < 0 ? -Math.sqrt(disc) : Math.sqrt(disc)))
    const first = a !== 0 ? q / (3 * a) : 1
    const second = q !== 0 ? c / q : 1
    t1 = first > 0 && first < 1 ? first : 1
    t2 = second > 0 && second < 1 ? second : 1
    if (t1 > t2) [t1, t2] = [t2, t1]
  }
  let low = 0
  let lowValue = d0
  if (Math.abs(d0) <= CONTACT) found(0)
  for (const high of t1 === 1 ? [1] : t2 === 1 || t2 === t1 ? [t1, 1] : [t1, t2, 1]) {
    const highValue = at(high)
    const touching = Math.abs(highValue) <= CONTACT
    if (touching) found(high)
    else if (Math.abs(lowValue) > CONTACT && lowValue > 0 !== highValue > 0) {
      let l = low
      let h = high
      let t = (l + h) / 2
      for (let i = 0; i < 64; i++) {
        const value = at(t)
        if (value === 0) break
        if (value > 0 === lowValue > 0) l = t
        else h = t
        const slope = (3 * a * t + 2 * b) * t + c
        const next = t - value / slope
        const moved = next > l && next < h ? next : (l + h) / 2
        if (Math.abs(moved - t) < 1e-16 || h - l < 1e-16) break
        t = moved
      }
      found(t)
    }
    low = high
    lowValue = highValue
  }
}

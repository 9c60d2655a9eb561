import type { CubicSegment, Path, Point, Segment } from '../contract'
import { lengthBefore, pathLength } from './along'
import { crossings } from './crossings'
import { lengthTo } from './length'
import { evaluate, tangentAt } from './segment'

/** A place where two paths (or two stretches of one) meet: mm along each, and the point. */
export interface Intersection {
  readonly a: number
  readonly b: number
  readonly point: Point
}

/** Meetings closer than this (mm) are one. */
const SAME = 1e-6
/** Boxes this close (mm) may touch. */
const HAIR = 1e-9

/**
 * Every place where two paths meet, sorted by the distance along the first; touching and shared end points count. Where
 * they lie along one another, the ends of the shared stretch.
 */
export const intersections = (a: Path, b: Path): Intersection[] => {
  const found: Intersection[] = []
  for (let i = 0; i < a.segments.length; i++) {
    const s = a.segments[i]!
    for (let j = 0; j < b.segments.length; j++) {
      const r = b.segments[j]!
      if (boxesApart(s, r)) continue
      crossings(s, r, (t, u) => {
        found.push({
          a: lengthBefore(a, i) + lengthTo(s, t),
          b: lengthBefore(b, j) + lengthTo(r, u),
          point: evaluate(s, t),
        })
      })
    }
  }
  return found.length < 2 ? found : distinct(found)
}

/** The box around each segment's controls, a hair wider: left, top, right, bottom. Grown as needed, used at once. */
let boxes = new Float64Array(256)

const fillBoxes = (segments: readonly Segment[]): void => {
  if (boxes.length < segments.length * 4) boxes = new Float64Array(segments.length * 8)
  for (let i = 0; i < segments.length; i++) {
    const s = segments[i]!
    const { from, to } = s
    let left = from.x < to.x ? from.x : to.x
    let right = from.x < to.x ? to.x : from.x
    let top = from.y < to.y ? from.y : to.y
    let bottom = from.y < to.y ? to.y : from.y
    if (s.kind === 'cubic') {
      const { control1: p, control2: q } = s
      if (p.x < left) left = p.x
      else if (p.x > right) right = p.x
      if (q.x < left) left = q.x
      else if (q.x > right) right = q.x
      if (p.y < top) top = p.y
      else if (p.y > bottom) bottom = p.y
      if (q.y < top) top = q.y
      else if (q.y > bottom) bottom = q.y
    }
    boxes[4 * i] = left - HAIR
    boxes[4 * i + 1] = top - HAIR
    boxes[4 * i + 2] = right + HAIR
    boxes[4 * i + 3] = bottom + HAIR
  }
}

/**
 * Every place where a path meets itself, once each with a < b. Joints of neighbouring segments, and the closing joint of a
 * closed path, do not count.
 */
export const selfIntersections = (path: Path): Intersection[] => {
  const found: Intersection[] = []
  const { segments, closed } = path
  const count = segments.length
  fillBoxes(segments)
  for (let i = 0; i < count; i++) {
    const s = segments[i]!
    if (s.kind === 'cubic') {
      ownLoop(s, (t, u) => {
        const a = lengthBefore(path, i) + lengthTo(s, t)
        const b = lengthBefore(path, i) + lengthTo(s, u)
        if (b - a > 2 * SAME) found.push({ a, b, point: evaluate(s, t) })
      })
    }
    const left = boxes[4 * i]!
    const top = boxes[4 * i + 1]!
    const right = boxes[4 * i + 2]!
    const bottom = boxes[4 * i + 3]!
    for (let j = i + 1; j < count; j++) {
      if (boxes[4 * j]! > right || boxes[4 * j + 2]! < left) continue
      if (boxes[4 * j + 1]! > bottom || boxes[4 * j + 3]! < top) continue
      const r = segments[j]!
      const next = j === i + 1
      const round = closed && i === 0 && j === count - 1
      if ((next && onlyJoined(s, r)) || (round && onlyJoined(r, s))) continue
      meetings(path, i, j, next || round, found)
    }
  }
  return found.length < 2 ? found : distinct(found)
}

/** Adds where two of a path's segments meet, other than at a joint that they share. */
const meetings = (path: Path, i: number, j: number, neighbours: boolean, found: Intersection[]): void => {
  const s = path.segments[i]!
  const r = path.segments[j]!
  crossings(s, r, (t, u) => {
    const a = lengthBefore(path, i) + lengthTo(s, t)
    const b = lengthBefore(path, j) + lengthTo(r, u)
    const apart = path.closed ? Math.min(b - a, pathLength(path) - (b - a)) : b - a
    if (apart > (neighbours ? 1e-4 : 2 * SAME)) found.push({ a, b, point: evaluate(s, t) })
  })
}

const boxesApart = (a: Segment, b: Segment): boolean =>
  low(a, 'x') > high(b, 'x') + HAIR ||
  low(b, 'x') > high(a, 'x') + HAIR ||
  low(a, 'y') > high(b, 'y') + HAIR ||
  low(b, 'y') > high(a, 'y') + HAIR

const low = (s: Segment, axis: 'x' | 'y'): number => {
  const ends = Math.min(s.from[axis], s.to[axis])
  return s.kind === 'line' ? ends : Math.min(ends, s.control1[axis], s.control2[axis])
}

const high = (s: Segment, axis: 'x' | 'y'): number => {
  const ends = Math.max(s.from[axis], s.to[axis])
  return s.kind === 'line' ? ends : Math.max(ends, s.control1[axis], s.control2[axis])
}

/** Whether neighbours surely meet at their joint only: lines that do not double back, curves that keep going forward. */
const onlyJoined = (a: Segment, b: Segment): boolean => {
  if (a.kind === 'line' && b.kind === 'line') {
    const ax = a.to.x - a.from.x
    const ay = a.to.y - a.from.y
    const bx = b.to.x - b.from.x
    const by = b.to.y - b.from.y
    const turn = ax * by - ay * bx
    const along = ax * bx + ay * by
    if (turn * turn > 1e-18 * along * along) return true
  }
  return goOnTogether(a, b) || goRoundTogether(a, b)
}

/** Whether two segments lie on opposite sides of some line through their joint. */
const goRoundTogether = (a: Segment, b: Segment): boolean => {
  // Across the bisector of the directions in which they come and go.
  const back = tangentAt(a, 1)
  const on = tangentAt(b, 0)
  const x = back.x + on.x
  const y = back.y + on.y
  return x * x + y * y > 1e-6 && behind(a, a.to, x, y) && behind(b, b.from, -x, -y)
}

/** Whether all of a segment but the joint itself lies behind the joint, seen along a direction. */
const behind = (s: Segment, joint: Point, x: number, y: number): boolean => {
  const near = (p: Point): boolean => (p.x - joint.x) * x + (p.y - joint.y) * y < 0
  if (!near(s.from === joint ? s.to : s.from)) return false
  if (s.kind === 'line') return true
  const first = s.from === joint ? s.control2 : s.control1
  const last = s.from === joint ? s.control1 : s.control2
  return near(first) && near(last)
}

/** Whether both segments keep moving forward in one common direction, so that they meet at their joint only. */
const goOnTogether = (a: Segment, b: Segment): boolean => {
  const x = b.to.x - a.from.x
  const y = b.to.y - a.from.y
  return movesAlong(a, x, y) && movesAlong(b, x, y)
}

/** Whether a segment moves forward along a direction all the way. */
export const movesAlong = (s: Segment, x: number, y: number): boolean => {
  const { from, to } = s
  if (s.kind === 'line') return (to.x - from.x) * x + (to.y - from.y) * y > 0
  const { control1: p, control2: q } = s
  const first = (p.x - from.x) * x + (p.y - from.y) * y
  const middle = (q.x - p.x) * x + (q.y - p.y) * y
  const last = (to.x - q.x) * x + (to.y - q.y) * y
  return first >= 0 && middle >= 0 && last >= 0 && first + middle + last > 0
}

/** The one place where a cubic can cross itself, in closed form from B(t) = B(u), t ≠ u. */
export const ownLoop = (s: CubicSegment, meet: (t: number, u: number) => void): void => {
  const { from, control1, control2, to } = s
  const ax = to.x - from.x + 3 * (control1.x - control2.x)
  const ay = to.y - from.y + 3 * (control1.y - control2.y)
  const bx = 3 * (from.x - 2 * control1.x + control2.x)
  const by = 3 * (from.y - 2 * control1.y + control2.y)
  const cx = 3 * (control1.x - from.x)
  const cy = 3 * (control1.y - from.y)
  const turn = ax * by - ay * bx
  const square = ax * ax + ay * ay
  if (turn === 0 || square === 0) return
  const sum = -(ax * cy - ay * cx) / turn
  const product = sum * sum + ((bx * sum + cx) * ax + (by * sum + cy) * ay) / square
  const disc = sum * sum - 4 * product
  if (!(disc > 1e-12)) return
  const half = Math.sqrt(disc) / 2
  const t = sum / 2 - half
  const u = sum / 2 + half
  if (t >= -1e-12 && u <= 1 + 1e-12) meet(Math.max(0, t), Math.min(1, u))
}

/** Sorted by a, then b, with repeats of one meeting (at joints, on halvings) left out. */
const distinct = (found: Intersection[]): Intersection[] => {
  found.sort((p, q) => p.a - q.a || p.b - q.b)
  const kept: Intersection[] = []
  for (const one of found) {
    let again = false
    for (let i = kept.length - 1; i >= 0 && one.a - kept[i]!.a <= SAME; i--) {
      if (Math.abs(one.b - kept[i]!.b) <= SAME) again = true
    }
    if (!again) kept.push(one)
  }
  return kept
}

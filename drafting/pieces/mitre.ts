import type { Point, Segment } from '../contract'
import { intersections } from '../geometry/intersect'
import { endOf, pathLength, startOf } from '../geometry/path'
import { cross, distance, dot, subtract, unit } from '../geometry/point'
import { line } from '../geometry/segment'
import { meetLine } from './meet-line'
import { MITRE_LIMIT, type Side, type Turn } from './outline-edge'

/** Ends closer than this (mm) are one point. */
const SAME = 1e-4

/** Both allowances run on until they meet; past 2.5 × the larger one the corner is cut square to its bisector. */
export const mitre = (a: Side, b: Side, at: Point): Turn => {
  const dx = b.start.x - a.end.x
  const dy = b.start.y - a.end.y
  const along = dot(a.arriving, b.leaving)
  const shortened = along > 0 && (a.tight || b.tight) ? cutBack(a, b) : undefined
  if (shortened) return shortened
  if (Math.abs(dx) + Math.abs(dy) <= SAME && (along > 0 || a.allowance + b.allowance === 0))
    return straightOn(a, b)
  const turn = cross(a.arriving, b.leaving)
  if (turn < 0 && along > -1) {
    const inner = innerCorner(a, b)
    if (inner) return inner
  }
  if (Math.abs(turn) < 1e-9) return along > 0 ? stepOrAcross(a, b, at) : bevel(a, b, at, a.arriving)
  const ahead = (dx * b.leaving.y - dy * b.leaving.x) / turn
  const back = (a.arriving.x * dy - a.arriving.y * dx) / turn
  // A joint that is met to within rounding is met.
  if (ahead < -SAME || back < -SAME) return crossing(a, b, at) ?? stepOrAcross(a, b, at)
  // Along the side without allowance, so that a nett edge is only ever prolonged.
  const meet =
    b.allowance === 0
      ? { x: b.start.x - b.leaving.x * back, y: b.start.y - b.leaving.y * back }
      : { x: a.end.x + a.arriving.x * ahead, y: a.end.y + a.arriving.y * ahead }
  const limit = MITRE_LIMIT * Math.max(a.allowance, b.allowance)
  if (distance(meet, at) > limit + 1e-9)
    return turn > 0 ? bevel(a, b, at, subtract(meet, at)) : stepOrAcross(a, b, at)
  return { joint: meet, lead: [line(meet, b.start)] }
}

/** The two sides go on from one another: one point. */
const straightOn = (a: Side, b: Side): Turn => ({ joint: b.allowance === 0 ? b.start : a.end, lead: [] })

/** Two edges of one curve that bends tighter than its allowance where they join: their offsets cross before their ends. */
const cutBack = (a: Side, b: Side): Turn | undefined => {
  const one = intersections(a.offset, b.offset)[0]
  if (!one || one.a > pathLength(a.offset) - 1e-3) return undefined
  return { joint: one.point, leave: one.a, lead: [], enter: one.b }
}

/** At an inner corner the offsets cross: both are cut back to there. */
const innerCorner = (a: Side, b: Side): Turn | undefined => {
  const found = intersections(a.offset, b.offset)
  const one = found[found.length - 1]
  if (!one) return undefined
  // Two edges that make a whole piece meet at their other corner too.
  const ring = distance(startOf(a.edge.path), endOf(b.edge.path)) < SAME
  if (ring && one.a < pathLength(a.offset) / 2) return undefined
  return { joint: one.point, leave: one.a, lead: [], enter: one.b }
}

/** One side is cut back by the other's straight continuation, unless that would take more than the mitre's limit. */
const crossing = (a: Side, b: Side, at: Point): Turn | undefined => {
  const limit = MITRE_LIMIT * Math.max(a.allowance, b.allowance)
  const near = (p: Point): boolean => distance(p, at) <= limit
  const onA = meetLine(a, false, b.start, b.leaving)
  if (onA?.along !== undefined && near(onA.point) && behind(onA.point, b)) {
    return { joint: onA.point, leave: onA.along, lead: [line(onA.point, b.start)] }
  }
  const onB = meetLine(b, true, a.end, a.arriving)
  if (onB?.along !== undefined && near(onB.point) && ahead(onB.point, a)) {
    return { joint: onB.point, lead: [], enter: onB.along }
  }
  return undefined
}

const behind = (p: Point, side: Side): boolean => dot(subtract(p, side.start), side.leaving) <= 0

const ahead = (p: Point, side: Side): boolean => dot(subtract(p, side.end), side.arriving) >= 0

/**
 * A sharp corner cut off square to the line from the corner to where the mitre would be (with equal allowances the bisector), so
 * that nothing lies farther from the corner than 2.5 × the larger allowance.
 */
const bevel = (a: Side, b: Side, at: Point, towardsMitre: Point): Turn => {
  const limit = MITRE_LIMIT * Math.max(a.allowance, b.allowance)
  const towards = unit(towardsMitre)
  const back = { x: -b.leaving.x, y: -b.leaving.y }
  const reach = Math.min(
    reached(subtract(a.end, at), a.arriving, towards, limit),
    reached(subtract(b.start, at), back, towards, limit),
  )
  const first = runTo(a.end, a.arriving, at, towards, reach)
  const second = runTo(b.start, back, at, towards, reach)
  return { joint: first, lead: [line(first, second), line(second, b.start)] }
}

/** How far towards the mitre a straight line has come when it is at the limit from the corner; all relative to the corner. */
const reached = (from: Point, along: Point, towards: Point, limit: number): number => {
  const by = dot(from, along)
  const run = -by + Math.sqrt(Math.max(0, by * by - dot(from, from) + limit * limit))
  return dot(from, towards) + run * dot(along, towards)
}

/** A line run on until it has come so far towards the mitre. */
const runTo = (from: Point, along: Point, at: Point, towards: Point, reach: number): Point => {
  const run = Math.max(0, (reach - dot(subtract(from, at), towards)) / dot(along, towards))
  return { x: from.x + along.x * run, y: from.y + along.y * run }
}

/**
 * A right-angled step at the corner point: the wider allowance keeps its full width to the very end, then drops straight to
 * the narrower one. Where neither is the wider (equal allowances, a real corner), a mitre.
 */
export const step = (a: Side, b: Side, at: Point): Turn => stepIfUneven(a, b, at) ?? mitre(a, b, at)

const stepIfUneven = (a: Side, b: Side, at: Point): Turn | undefined => {
  const along = dot(a.arriving, b.leaving)
  if (a.allowance * along > b.allowance) {
    const met = meetLine(b, true, a.end, unit(subtract(at, a.end)))
    if (met) return { joint: a.end, lead: leadTo(a.end, met.point, b, met.along), enter: met.along }
  } else if (b.allowance * along > a.allowance) {
    const met = meetLine(a, false, b.start, unit(subtract(at, b.start)))
    if (met) return { joint: met.point, leave: met.along, lead: [line(met.point, b.start)] }
  }
  return undefined
}

/** The step, or where there is none a straight way across, which is no clean corner. */
const stepOrAcross = (a: Side, b: Side, at: Point): Turn =>
  stepIfUneven(a, b, at) ?? { joint: a.end, lead: [line(a.end, b.start)], failed: true }

/** Straight from the joint to a meeting with the second offset, and along its continuation to its start. */
const leadTo = (joint: Point, meet: Point, b: Side, along: number | undefined): Segment[] => {
  const lead: Segment[] = [line(joint, meet)]
  if (along === undefined) lead.push(line(meet, b.start))
  return lead
}

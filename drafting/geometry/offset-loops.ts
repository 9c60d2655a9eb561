import type { Path, Point, Segment } from '../contract'
import { lengthsOf, pathLength, tangentOn } from './along'
import { selfIntersections, type Intersection } from './intersect'
import { nearestOn } from './nearest'
import { slicePath } from './path'
import { cubic, line } from './segment'
import { endOf, startOf } from './ends'
import { sweptOffset } from './swept'

/**
 * A parallel before its loops are cut away. `gaps` are the numbers of straight bridges where it is not parallel to
 * anything: at inner corners, and where the source is tighter than the distance. `corners` are the numbers of the segments
 * that start at an outer corner.
 */
export interface RawOffset {
  readonly segments: Segment[]
  readonly gaps: { readonly index: number; readonly tight: boolean }[]
  readonly corners: number[]
}

/** A parallel may come this much (mm) too near its source by fitting alone. */
const NEAR = 0.02

/**
 * Walks the raw parallel and, wherever it meets itself outside the strip that it bounds, steps over the loop between. The
 * strip's square ends walk along, so that a loop reaching past an end is cut there. `clipped` unless each loop was that of
 * a single inner corner. What cannot be settled so is swept out as an area.
 */
export const trimLoops = (
  source: Path,
  distance: number,
  raw: RawOffset,
): { path: Path; clipped: boolean } => {
  const first = startOf(source)
  const last = endOf(source)
  const segments = [
    line(first, raw.segments[0]!.from),
    ...raw.segments,
    line(raw.segments[raw.segments.length - 1]!.to, last),
  ]
  const path: Path = { segments, closed: false }
  const ends = lengthsOf(path)
  const reach = Math.abs(distance)
  // The two square ends of a ring lie on one another: that is where it closes.
  const ring = Math.abs(first.x - last.x) + Math.abs(first.y - last.y) < 1e-6
  const far = pathLength(path) - reach
  const meetings = selfIntersections(path).filter(
    (one) => !(ring && one.a < reach + 1e-6 && one.b > far - 1e-6) && isOutside(source, one.point, distance),
  )
  const stretches: Path[] = []
  let clipped = false
  let bridges = raw.gaps.length
  let at = 0
  let next = firstFrom(meetings, at)
  let start = reach
  let end = far
  // Where the path is too tight at its very end, and no loop closes there, the parallel starts beyond the stretch.
  if (raw.gaps[0]?.index === 0 && (!next || next.a > ends[1]! - 1e-6)) {
    start = at = ends[1]!
    next = firstFrom(meetings, at)
    clipped = true
    bridges--
  }
  for (; next; next = firstFrom(meetings, at)) {
    const skipped = within(ends, raw, next.a, next.b)
    clipped ||= skipped.tight > 0 || skipped.inner !== 1 || skipped.outer > 0
    bridges -= skipped.tight + skipped.inner
    if (next.a > start) stretches.push(slicePath(path, Math.max(at, start), next.a))
    at = next.b
  }
  const final = raw.segments.length - 1
  if (bridges > 0 && raw.gaps[raw.gaps.length - 1]!.index === final && at <= ends[final]! + 1e-6) {
    end = ends[final]!
    clipped = true
    bridges--
  }
  if (bridges > 0) return { path: sweptOffset(source, distance), clipped: true }
  if (at < end) stretches.push(slicePath(path, Math.max(at, start), end))
  const kept = weld(stretches)
  if (kept.segments.length > 0) return { path: kept, clipped }
  return { path: slicePath(path, at, at), clipped: true }
}

/** Whether a point is not inside the strip with square ends that the parallel bounds. */
const isOutside = (source: Path, point: Point, distance: number): boolean => {
  const near = nearestOn(source, point)
  if (near.gap >= Math.abs(distance) - NEAR) return true
  const tangent = tangentOn(source, near.distance)
  const x = point.x - near.point.x
  const y = point.y - near.point.y
  const along = tangent.x * x + tangent.y * y
  if (near.distance <= 0 && along <= NEAR) return true
  return near.distance >= pathLength(source) && along >= -NEAR
}

/** The first meeting at or after a place; of several there the one that steps furthest. */
const firstFrom = (meetings: readonly Intersection[], at: number): Intersection | undefined => {
  let found: Intersection | undefined
  for (const one of meetings) {
    if (one.a < at - 1e-9) continue
    if (!found || one.a < found.a - 1e-6 || (one.a < found.a + 1e-6 && one.b > found.b)) found = one
  }
  return found
}

/** How many bridges and outer corners lie wholly in the stretch between two distances along the walk. */
const within = (
  ends: Float64Array,
  raw: RawOffset,
  from: number,
  to: number,
): { readonly tight: number; readonly inner: number; readonly outer: number } => {
  // The walk has one segment more in front: the strip's square start.
  const holds = (index: number): boolean => ends[index]! >= from - 1e-6 && ends[index + 1]! <= to + 1e-6
  let tight = 0
  let inner = 0
  for (const gap of raw.gaps) {
    if (!holds(gap.index)) continue
    if (gap.tight) tight++
    else inner++
  }
  return { tight, inner, outer: raw.corners.filter((index) => holds(index)).length }
}

/** Joins stretches whose ends are one computed meeting, making them the very same point. */
const weld = (stretches: readonly Path[]): Path => {
  const segments: Segment[] = []
  let end: Point | undefined
  for (const stretch of stretches) {
    for (const segment of stretch.segments) {
      const from: Point = end ?? segment.from
      if (segment.kind === 'cubic') {
        const { control1, control2, to } = segment
        segments.push(from === segment.from ? segment : cubic(from, control1, control2, to))
      } else if (segments.length === 0 || from.x !== segment.to.x || from.y !== segment.to.y) {
        segments.push(from === segment.from ? segment : line(from, segment.to))
      }
      end = segment.to
    }
  }
  return { segments, closed: false }
}

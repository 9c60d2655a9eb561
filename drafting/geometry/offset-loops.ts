import type { Path, Point, Segment } from '../contract'
import { lengthsOf, pathLength, tangentOn } from './along'
import { selfIntersections, type Intersection } from './intersect'
import { nearestOn } from './nearest'
import { slicePath } from './path'
import { cubic, line } from './segment'
import { sweptOffset } from './swept'

/**
 * A parallel before its loops are cut away. `gaps` are the numbers of straight bridges where it is not parallel to
 * anything: at inner corners, and where the source is tighter than the distance. `corners` are the first segments of outer
 * corners' second sides.
 */
export interface RawOffset {
  readonly segments: Segment[]
  readonly gaps: { readonly index: number; readonly tight: boolean }[]
  readonly corners: number[]
}

/** A parallel may come this much (mm) too near its source by fitting alone. */
const NEAR = 0.02

/**
 * Walks the raw parallel and, where it meets itself at the full distance from the source, steps over the loop between.
 * `clipped` unless each loop was that of a single inner corner. What cannot be settled so is swept out as an area.
 */
export const trimLoops = (
  source: Path,
  distance: number,
  raw: RawOffset,
): { path: Path; clipped: boolean } => {
  const path: Path = { segments: raw.segments, closed: false }
  const meetings = selfIntersections(path).filter((one) => isFullDistance(source, one.point, distance))
  if (meetings.length === 0 && raw.gaps.length === 0) return { path, clipped: false }
  const stretches: Path[] = []
  let clipped = false
  let bridges = raw.gaps.length
  let at = 0
  for (let next = firstFrom(meetings, at); next; next = firstFrom(meetings, at)) {
    const skipped = within(path, raw, next.a, next.b)
    clipped ||= skipped.tight > 0 || skipped.inner !== 1 || skipped.outer > 0
    bridges -= skipped.tight + skipped.inner
    stretches.push(slicePath(path, at, next.a))
    at = next.b
  }
  if (bridges > 0) return { path: sweptOffset(source, distance), clipped: true }
  stretches.push(slicePath(path, at, pathLength(path)))
  return { path: weld(stretches), clipped }
}

const isFullDistance = (source: Path, point: Point, distance: number): boolean => {
  const near = nearestOn(source, point)
  if (near.gap < Math.abs(distance) - NEAR) return false
  const tangent = tangentOn(source, near.distance)
  const side = tangent.x * (point.y - near.point.y) - tangent.y * (point.x - near.point.x)
  return side * distance < 0
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

/** What lies wholly in the stretch between two distances along the raw parallel. */
const within = (
  path: Path,
  raw: RawOffset,
  from: number,
  to: number,
): { tight: number; inner: number; outer: number } => {
  const ends = lengthsOf(path)
  const holds = (index: number): boolean =>
    (index > 0 ? ends[index - 1]! : 0) >= from - 1e-6 && ends[index]! <= to + 1e-6
  let tight = 0
  let inner = 0
  for (const gap of raw.gaps) {
    if (!holds(gap.index)) continue
    if (gap.tight) tight++
    else inner++
  }
  return { tight, inner, outer: raw.corners.filter(holds).length }
}

/** Joins stretches whose ends are one computed meeting, making them the very same point. */
export const weld = (stretches: readonly Path[]): Path => {
  const segments: Segment[] = []
  let end: Point | undefined
  for (const stretch of stretches) {
    for (const segment of stretch.segments) {
      const from: Point = end ?? segment.from
      if (segment.kind === 'line') {
        if (from.x === segment.to.x && from.y === segment.to.y && segments.length > 0) continue
        segments.push(from === segment.from ? segment : line(from, segment.to))
      } else {
        segments.push(
          from === segment.from ? segment : cubic(from, segment.control1, segment.control2, segment.to),
        )
      }
      end = segment.to
    }
  }
  return { segments, closed: false }
}

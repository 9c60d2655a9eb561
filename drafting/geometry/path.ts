import type { LineSegment, Path, Point, Segment } from '../contract'
import { lengthsOf } from './along'
import { parameterAt } from './length'
import { cubic, evaluate, line, reverseSegment, sliceSegment } from './segment'

export { pathLength, pointAt, tangentOn } from './along'
export { bounds, containsPoint, isClockwise, signedArea } from './area'
export { endOf, endTangent, startOf, startTangent } from './ends'
export { flatten } from './flatten'
export { nearestOn } from './nearest'

/** Ends that agree within this many mm are made one point. */
const SNAP = 1e-6

export const openPath = (segments: readonly Segment[]): Path => ({ segments, closed: false })

/** A closed path; the last end is snapped to the first start. Throws when they are more than 1e-6 mm apart. */
export const closedPath = (segments: readonly Segment[]): Path => {
  const first = segments[0]
  const last = segments[segments.length - 1]
  if (!first || !last) return { segments, closed: true }
  if (sameCoordinates(last.to, first.from)) return { segments, closed: true }
  requireTouching(last.to, first.from)
  return { segments: [...segments.slice(0, -1), withEnd(last, first.from)], closed: true }
}

/** Straight lines from point to point. Fewer than two points give an empty path. */
export const polyline = (points: readonly Point[]): Path => {
  const segments: LineSegment[] = []
  for (let i = 1; i < points.length; i++) segments.push(line(points[i - 1]!, points[i]!))
  return openPath(segments)
}

/**
 * Open paths one after the other as one open path. Ends that agree within 1e-6 mm become exactly one point (the earlier
 * path's end); throws when two neighbours are further apart.
 */
export const joinPaths = (...paths: readonly Path[]): Path => {
  const segments: Segment[] = []
  let end: Point | undefined
  for (const path of paths) {
    for (let segment of path.segments) {
      if (end && !sameCoordinates(end, segment.from)) {
        requireTouching(end, segment.from)
        segment = withStart(segment, end)
      }
      segments.push(segment)
      end = segment.to
    }
  }
  return openPath(segments)
}

/** The same path travelled the other way; a closed path stays closed and keeps its starting point. */
export const reversePath = (path: Path): Path => {
  const segments: Segment[] = []
  for (let i = path.segments.length - 1; i >= 0; i--) segments.push(reverseSegment(path.segments[i]!))
  return { segments, closed: path.closed }
}

/**
 * The open stretch between two distances in mm (from ≤ to, both held to the path). At 0 and at the whole length it has
 * the path's own end points; slivers under 1e-9 mm are left out.
 */
export const slicePath = (path: Path, from: number, to: number): Path => {
  const table = lengthsOf(path)
  const whole = table.length > 0 ? table[table.length - 1]! : 0
  const low = from > 0 ? from : 0
  const high = to < whole ? to : whole
  if ((low === 0 && high === whole) || whole <= 1e-9) return path.closed ? openPath(path.segments) : path
  const segments: Segment[] = []
  for (let i = 0; i < table.length; i++) {
    const start = i > 0 ? table[i - 1]! : 0
    const end = table[i]!
    if (end <= low + 1e-9 && !(end === whole && low >= whole)) continue
    if (start >= high - 1e-9 && segments.length > 0) break
    const segment = path.segments[i]!
    const t0 = low > start + 1e-9 ? parameterAt(segment, low - start) : 0
    const t1 = high < end - 1e-9 ? parameterAt(segment, high - start) : 1
    segments.push(t1 > t0 ? sliceSegment(segment, t0, t1) : dotAt(segment, t0))
  }
  return openPath(segments)
}

const dotAt = (segment: Segment, t: number): LineSegment => {
  const at = evaluate(segment, t)
  return line(at, at)
}

const sameCoordinates = (a: Point, b: Point): boolean => a === b || (a.x === b.x && a.y === b.y)

const requireTouching = (a: Point, b: Point): void => {
  if (!(Math.abs(a.x - b.x) <= SNAP && Math.abs(a.y - b.y) <= SNAP)) {
    throw new RangeError(
      `Paths can be joined only where they touch (within ${SNAP} mm): one ends at ${a.x}, ${a.y}, the next starts at ${b.x}, ${b.y}.`,
    )
  }
}

const withStart = (segment: Segment, from: Point): Segment =>
  segment.kind === 'line'
    ? line(from, segment.to)
    : cubic(from, segment.control1, segment.control2, segment.to)

const withEnd = (segment: Segment, to: Point): Segment =>
  segment.kind === 'line'
    ? line(segment.from, to)
    : cubic(segment.from, segment.control1, segment.control2, to)

import type { Path, Point, Segment } from '../contract'
import { cubic, line } from '../geometry/segment'
import { slicePath } from '../geometry/path'
import type { Side, Turn } from './outline-edge'

/** Ends closer than this (mm) are made one point. */
const SNAP = 1e-6

/**
 * One edge's stretch of the cut line, from its start corner's joint to the next one's: the lead out of the corner, the
 * offset between where it is entered and left, and straight on to the next joint. Straight pieces in line become one.
 */
export const cutOf = (side: Side | undefined, turn: Turn, next: Turn): Path => {
  const segments: Segment[] = []
  let end = turn.joint
  const add = (segment: Segment): void => {
    if (segment.kind === 'cubic') {
      segments.push(
        end === segment.from ? segment : cubic(end, segment.control1, segment.control2, segment.to),
      )
      end = segment.to
      return
    }
    if (near(end, segment.to)) return
    const last = segments[segments.length - 1]
    if (last?.kind === 'line' && inLine(last.from, end, segment.to)) {
      segments[segments.length - 1] = line(last.from, segment.to)
    } else segments.push(end === segment.from ? segment : line(end, segment.to))
    end = segment.to
  }
  for (const segment of turn.lead) add(segment)
  if (side) {
    const body =
      turn.enter === undefined && next.leave === undefined
        ? side.offset
        : slicePath(side.offset, turn.enter ?? 0, next.leave ?? Infinity)
    if (turn.enter === undefined || next.leave === undefined || next.leave > turn.enter) {
      for (const segment of body.segments) add(segment)
    }
  }
  finish(segments, end, next.joint, turn.joint)
  return { segments, closed: false }
}

/** Brings the last segment to the joint exactly. */
const finish = (segments: Segment[], end: Point, joint: Point, start: Point): void => {
  if (end.x === joint.x && end.y === joint.y && segments.length > 0) return
  const last = segments[segments.length - 1]
  if (!last) segments.push(line(start, joint))
  else if (near(end, joint) || (last.kind === 'line' && inLine(last.from, end, joint))) {
    segments[segments.length - 1] =
      last.kind === 'line' ? line(last.from, joint) : cubic(last.from, last.control1, last.control2, joint)
  } else segments.push(line(end, joint))
}

const near = (a: Point, b: Point): boolean => Math.abs(a.x - b.x) <= SNAP && Math.abs(a.y - b.y) <= SNAP

/** Whether b lies on the straight way from a to c. */
const inLine = (a: Point, b: Point, c: Point): boolean => {
  const x = c.x - a.x
  const y = c.y - a.y
  const square = x * x + y * y
  const along = (b.x - a.x) * x + (b.y - a.y) * y
  const off = (b.x - a.x) * y - (b.y - a.y) * x
  return along >= 0 && along <= square && off * off <= 1e-14 * square
}

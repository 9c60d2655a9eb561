import type { Path, Point } from '../contract'
import { endOf, endTangent, startOf, startTangent } from '../geometry/ends'
import { intersections } from '../geometry/intersect'
import { openPath, pathLength, polyline, reversePath, slicePath } from '../geometry/path'
import { line } from '../geometry/segment'

/** Ends nearer than this, mm, are where they belong. */
const SAME = 1e-3
const FAR = 400

/**
 * A parallel whose loops were cut away up to an end of its edge no longer ends beside that end, and its corner there would be
 * cut wrong. It is led on along the straight line on which the true parallel arrives, so that the corner is still the one of
 * the two stitch lines.
 *
 * @param edge the stitch edge
 * @param offset its clipped parallel
 * @param allowance mm
 */
export const withTrueEnds = (edge: Path, offset: Path, allowance: number): Path => {
  const arriving = endTangent(edge)
  const leaving = startTangent(edge)
  const ended = ledTo(offset, beside(endOf(edge), arriving, allowance), arriving)
  const back = ledTo(reversePath(ended), beside(startOf(edge), leaving, allowance), {
    x: -leaving.x,
    y: -leaving.y,
  })
  return reversePath(back)
}

/** The point beside an end of the edge, to the left of travel. */
const beside = (at: Point, tangent: Point, by: number): Point => ({
  x: at.x + tangent.y * by,
  y: at.y - tangent.x * by,
})

/**
 * Ends a path on the straight line through a point, and at that point unless the path only meets the line beyond it: there
 * the corner cuts it back.
 */
const ledTo = (path: Path, to: Point, arrives: Point): Path => {
  const end = endOf(path)
  if (Math.hypot(end.x - to.x, end.y - to.y) < SAME) return path
  const back = { x: to.x - arrives.x * FAR, y: to.y - arrives.y * FAR }
  const ahead = { x: to.x + arrives.x * FAR, y: to.y + arrives.y * FAR }
  const met = intersections(path, polyline([back, ahead])).at(-1)
  if (!met || met.a < SAME) return openPath([...path.segments, line(end, to)])
  const kept = met.a < pathLength(path) - SAME ? slicePath(path, 0, met.a) : path
  const short = (to.x - met.point.x) * arrives.x + (to.y - met.point.y) * arrives.y
  return short > SAME ? openPath([...kept.segments, line(endOf(kept), to)]) : kept
}

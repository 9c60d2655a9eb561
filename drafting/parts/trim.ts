import type { Path, Point } from '../contract'
import {
  add,
  endOf,
  endTangent,
  intersections,
  joinPaths,
  line,
  openPath,
  pathLength,
  scale,
  slicePath,
  startOf,
  startTangent,
} from '../geometry'

/** A long straight line through a point. */
function through(at: Point, along: Point, reach: number): Path {
  return openPath([line(add(at, scale(along, -reach)), add(at, scale(along, reach)))])
}

/**
 * Cuts a path off where it meets two straight lines, running it on straight at its ends where it stops short of them.
 *
 * @param first the line on which the result starts: a point and a unit direction.
 * @param last the line on which it ends.
 * @returns undefined when the path never meets one of them.
 */
export function trimBetween(
  path: Path,
  first: { readonly at: Point; readonly along: Point },
  last: { readonly at: Point; readonly along: Point },
): Path | undefined {
  const spare = 120
  const longer = joinPaths(
    openPath([line(add(startOf(path), scale(startTangent(path), -spare)), startOf(path))]),
    path,
    openPath([line(endOf(path), add(endOf(path), scale(endTangent(path), spare)))]),
  )
  const start = intersections(longer, through(first.at, first.along, 2000))
  const end = intersections(longer, through(last.at, last.along, 2000))
  const middle = pathLength(longer) / 2
  const from = start.filter((one) => one.a < middle).at(-1) ?? start[0]
  const to = end.find((one) => one.a >= Math.max(middle, from?.a ?? 0)) ?? end.at(-1)
  if (!from || !to || to.a - from.a < 1) return undefined
  return slicePath(longer, from.a, to.a)
}

import type { Path, Point } from '../contract'
import { endOf } from '../geometry/ends'
import { joinPaths, openPath, pathLength, slicePath } from '../geometry/path'
import { line } from '../geometry/segment'
import type { Side } from './outline-edge'

/** The last `length` mm of a side's cut, up to a point on it (`along`) or on its straight continuation. */
export const upTo = (side: Side, point: Point, along: number | undefined, length: number): Path => {
  const stop = along ?? pathLength(side.offset)
  const path = slicePath(side.offset, Math.max(0, stop - length), stop)
  return along === undefined ? joinPaths(path, openPath([line(endOf(path), point)])) : path
}

/** The first `length` mm of a side's cut, from a point on it (`along`) or on its straight continuation backwards. */
export const startingAt = (side: Side, point: Point, along: number | undefined, length: number): Path => {
  const from = along ?? 0
  const path = slicePath(side.offset, from, from + length)
  return along === undefined ? joinPaths(openPath([line(point, side.start)]), path) : path
}

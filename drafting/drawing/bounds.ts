import type { Drawing, DrawingItem, Point } from '../contract'
import { bounds } from '../geometry/path'
import { textCorners } from './text-box'

/** The smallest upright box around all items; a point at 0,0 when there are none. */
export function boundsOf(items: readonly DrawingItem[]): Drawing['bounds'] {
  const corners: Point[] = []
  for (const item of items) {
    if (item.kind === 'text') {
      corners.push(...textCorners(item))
      continue
    }
    const { min, max } = bounds(item.path)
    corners.push(min, max)
  }
  return boundsOfPoints(corners)
}

/** The smallest upright box around all points; a point at 0,0 when there are none. */
export function boundsOfPoints(points: readonly Point[]): Drawing['bounds'] {
  if (points.length === 0) return { min: { x: 0, y: 0 }, max: { x: 0, y: 0 } }
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  for (const { x, y } of points) {
    if (x < minX) minX = x
    if (y < minY) minY = y
    if (x > maxX) maxX = x
    if (y > maxY) maxY = y
  }
  return { min: { x: minX, y: minY }, max: { x: maxX, y: maxY } }
}

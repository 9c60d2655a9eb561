import type { Drawing, DrawingItem, Point } from '../contract'
import { bounds } from '../geometry/path'
import { textCorners } from './text-box'

/** The smallest upright box around all items; a point at 0,0 when there are none. */
export function boundsOf(items: readonly DrawingItem[]): Drawing['bounds'] {
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  const take = (point: Point) => {
    minX = Math.min(minX, point.x)
    minY = Math.min(minY, point.y)
    maxX = Math.max(maxX, point.x)
    maxY = Math.max(maxY, point.y)
  }
  for (const item of items) {
    if (item.kind === 'text') textCorners(item).forEach(take)
    else {
      const box = bounds(item.path)
      take(box.min)
      take(box.max)
    }
  }
  if (minX > maxX) return { min: { x: 0, y: 0 }, max: { x: 0, y: 0 } }
  return { min: { x: minX, y: minY }, max: { x: maxX, y: maxY } }
}

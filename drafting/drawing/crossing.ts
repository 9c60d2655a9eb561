import type { DrawingItem, Point } from '../contract'
import { flatten } from '../geometry/path'
import { styleOf } from './styles'
import { textCorners } from './text-box'

/** An upright window on the drawing, mm. */
export interface PageWindow {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** An item's ink as straight strokes and the box around them, so that many windows can be asked quickly. */
export interface Ink {
  readonly points: readonly Point[]
  /** Whether the points enclose what is inked: a region of cloth rather than a line. */
  readonly region: boolean
  readonly min: Point
  readonly max: Point
}

/** The ink of an item: its line flattened to 0.05 mm and widened by its weight in the box, or the box of its text. */
export function inkOf(item: DrawingItem): Ink {
  const corners = item.kind === 'text' ? textCorners(item) : flatten(item.path)
  const points = item.kind === 'text' ? [...corners, ...corners.slice(0, 1)] : corners
  return inkOfPoints(points, item.kind === 'text' || styleOf(item.style).fill !== undefined)
}

/** The ink of a polygon or a polyline. */
export function inkOfPoints(points: readonly Point[], region: boolean): Ink {
  const xs = points.map((point) => point.x)
  const ys = points.map((point) => point.y)
  return {
    points,
    region,
    min: { x: Math.min(...xs), y: Math.min(...ys) },
    max: { x: Math.max(...xs), y: Math.max(...ys) },
  }
}

/** Whether any of the ink lies in the window: exact on the strokes, not on their boxes. */
export function crosses(ink: Ink, window: PageWindow): boolean {
  const right = window.x + window.width
  const bottom = window.y + window.height
  if (ink.max.x < window.x || ink.min.x > right || ink.max.y < window.y || ink.min.y > bottom) return false
  for (let index = 1; index < ink.points.length; index += 1) {
    const from = ink.points[index - 1]
    const to = ink.points[index]
    if (from && to && strokeCrosses(from, to, window)) return true
  }
  return (
    ink.region && encloses(ink.points, { x: window.x + window.width / 2, y: window.y + window.height / 2 })
  )
}

/** Whether a straight stroke touches a window. Liang and Barsky's test: what is left of the stroke after clipping by the four sides. */
export function strokeCrosses(from: Point, to: Point, window: PageWindow): boolean {
  const dx = to.x - from.x
  const dy = to.y - from.y
  let enter = 0
  let leave = 1
  const sides = [
    [-dx, from.x - window.x],
    [dx, window.x + window.width - from.x],
    [-dy, from.y - window.y],
    [dy, window.y + window.height - from.y],
  ] as const
  for (const [towards, room] of sides) {
    if (towards === 0) {
      if (room < 0) return false
      continue
    }
    const at = room / towards
    if (towards < 0) enter = Math.max(enter, at)
    else leave = Math.min(leave, at)
    if (enter > leave) return false
  }
  return true
}

/** Whether a closed polygon holds a point. */
export function encloses(points: readonly Point[], at: Point): boolean {
  let inside = false
  for (let index = 1; index < points.length; index += 1) {
    const from = points[index - 1]
    const to = points[index]
    if (!from || !to || from.y > at.y === to.y > at.y) continue
    if (from.x + ((to.x - from.x) * (at.y - from.y)) / (to.y - from.y) > at.x) inside = !inside
  }
  return inside
}

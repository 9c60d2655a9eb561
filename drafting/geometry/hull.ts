import type { Point } from '../contract'

/** Twice the area of a triangle; above zero when it turns clockwise on the sheet. */
const turn = (a: Point, b: Point, c: Point): number => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)

/** One side of the hull of points that are in order from left to right. */
function side(points: readonly Point[]): Point[] {
  const kept: Point[] = []
  for (const point of points) {
    while (kept.length > 1 && turn(kept.at(-2) as Point, kept.at(-1) as Point, point) <= 0) kept.pop()
    kept.push(point)
  }
  return kept.slice(0, -1)
}

/** The corners of the smallest shape without hollows that holds all points, clockwise (Andrew's monotone chain). */
export function hull(points: readonly Point[]): readonly Point[] {
  const sorted = points.toSorted((a, b) => a.x - b.x || a.y - b.y)
  return [...side(sorted), ...side(sorted.toReversed())]
}

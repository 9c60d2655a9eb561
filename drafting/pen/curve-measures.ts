import type { Path, Point } from '../contract'
import { distance, endOf, line, nearestOn, openPath, pathLength, pointAt, startOf } from '../geometry'

/** Inside a dart's point, so that the hole is hidden when it is sewn: 13 mm. Common practice, no published source. */
export function drillPoint(first: Path, second: Path, point: Point): Point {
  const mouth = { x: (startOf(first).x + endOf(second).x) / 2, y: (startOf(first).y + endOf(second).y) / 2 }
  const long = distance(mouth, point)
  const share = long > 26 ? 13 / long : 0.25
  return { x: point.x + (mouth.x - point.x) * share, y: point.y + (mouth.y - point.y) * share }
}

/** Depth of a curve at the middle of the straight line between its ends, mm. */
export function sagittaOf(path: Path): number {
  const from = startOf(path)
  const to = endOf(path)
  if (distance(from, to) < 1e-9) return 0
  const chord = openPath([line(from, to)])
  return nearestOn(chord, pointAt(path, pathLength(path) / 2)).gap
}

import type { Path, Point } from '../contract'

/**
 * Points of a polyline that stays within `tolerance` mm of the path. The first is the path's start and the last its end
 * (the same coordinates again when the path is closed); segment ends are kept exactly.
 */
export const flatten = (path: Path, tolerance = 0.05): Point[] => {
  const points: Point[] = []
  const first = path.segments[0]
  if (!first) return points
  points.push(first.from)
  const fineness = 0.75 / Math.max(tolerance, 1e-6)
  for (const segment of path.segments) {
    if (segment.kind === 'cubic') {
      const { from, control1, control2, to } = segment
      // The second derivative is at most 6 × the larger second difference; a chord over h strays by h²/8 of it.
      const x0 = from.x - 2 * control1.x + control2.x
      const y0 = from.y - 2 * control1.y + control2.y
      const x1 = control1.x - 2 * control2.x + to.x
      const y1 = control1.y - 2 * control2.y + to.y
      const bend = Math.sqrt(Math.max(x0 * x0 + y0 * y0, x1 * x1 + y1 * y1))
      const count = Math.min(4096, Math.ceil(Math.sqrt(bend * fineness)))
      for (let i = 1; i < count; i++) {
        const t = i / count
        const u = 1 - t
        const a = u * u * u
        const b = 3 * u * u * t
        const c = 3 * u * t * t
        const d = t * t * t
        points.push({
          x: a * from.x + b * control1.x + c * control2.x + d * to.x,
          y: a * from.y + b * control1.y + c * control2.y + d * to.y,
        })
      }
    }
    points.push(segment.to)
  }
  return points
}

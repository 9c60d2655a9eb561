import type { Path, Point, Segment } from '../contract'
import { segmentLength } from './length'
import { tangentAt } from './segment'

export const startOf = (path: Path): Point => path.segments[0]?.from ?? { x: 0, y: 0 }

export const endOf = (path: Path): Point => path.segments[path.segments.length - 1]?.to ?? { x: 0, y: 0 }

/** Unit vector of travel where the path starts; segments without length are passed over. */
export const startTangent = (path: Path): Point => {
  for (const segment of path.segments) if (!isDot(segment)) return tangentAt(segment, 0)
  return { x: 1, y: 0 }
}

/** Unit vector of travel where the path ends. */
export const endTangent = (path: Path): Point => {
  for (let i = path.segments.length - 1; i >= 0; i--) {
    const segment = path.segments[i]!
    if (!isDot(segment)) return tangentAt(segment, 1)
  }
  return { x: 1, y: 0 }
}

const isDot = (segment: Segment): boolean => {
  const { from, to } = segment
  if (Math.abs(to.x - from.x) > 1e-12 || Math.abs(to.y - from.y) > 1e-12) return false
  return segment.kind === 'line' || segmentLength(segment) <= 1e-12
}

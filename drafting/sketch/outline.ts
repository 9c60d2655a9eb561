import type { Edge, Path, Piece } from '../contract'
import {
  bounds,
  closedPath,
  endOf,
  joinPaths,
  line,
  mirrorX,
  openPath,
  reversePath,
  startOf,
  transformPath,
} from '../geometry'
import type { SketchLine } from './sketch-line'

const onAxis = ({ path }: Edge): boolean => {
  const { min, max } = bounds(path)
  return Math.abs(min.x) < 0.01 && Math.abs(max.x) < 0.01
}

/**
 * A piece as it looks when it is sewn: darts closed into lines, and unfolded where its edge lies on the centre line x = 0.
 * A piece away from the centre is drawn with its mirror image.
 */
export function wornOutline(piece: Piece): readonly SketchLine[] {
  const darts = piece.edges
    .filter((edge) => edge.role === 'dart')
    .flatMap(({ path }) => [inner(path), inner(transformPath(mirrorX, path))])
  const last = piece.edges.findLastIndex(onAxis)
  if (last < 0) {
    const whole = closedPath(withoutDarts(piece.edges).flatMap(({ segments }) => segments))
    return [shape(whole), shape(transformPath(mirrorX, whole)), ...darts]
  }
  const turned = [...piece.edges.slice(last + 1), ...piece.edges.slice(0, last)]
  const half = joinPaths(...withoutDarts(turned.filter((edge) => !onAxis(edge))))
  const other = reversePath(transformPath(mirrorX, half))
  return [shape(closedUp(half, other)), ...darts]
}

const shape = (path: Path): SketchLine => ({ kind: 'shape', path })
const inner = (path: Path): SketchLine => ({ kind: 'inner', path })

/** The paths of edges, with one straight line across the mouth of each dart. */
function withoutDarts(edges: readonly Edge[]): readonly Path[] {
  return edges.flatMap((edge, index) => {
    if (edge.role !== 'dart') return [edge.path]
    const next = edges[index + 1]
    if (next?.role !== 'dart') return []
    return [openPath([line(startOf(edge.path), endOf(next.path))])]
  })
}

/** Two halves as one closed outline; where they do not meet on the centre line, it runs straight across. */
function closedUp(one: Path, other: Path): Path {
  const across = (from: Path, to: Path) => {
    const [a, b] = [endOf(from), startOf(to)]
    return Math.hypot(a.x - b.x, a.y - b.y) > 1e-6 ? [line(a, b)] : []
  }
  return closedPath([...one.segments, ...across(one, other), ...other.segments, ...across(other, one)])
}

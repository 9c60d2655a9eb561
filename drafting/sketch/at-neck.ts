import type { Path, Piece, Point } from '../contract'
import {
  add,
  arcPath,
  bounds,
  closedPath,
  endOf,
  intersections,
  joinPaths,
  line,
  mirrorX,
  openPath,
  pathLength,
  reversePath,
  scale,
  slicePath,
  startOf,
  subtract,
  transformPath,
  unit,
} from '../geometry'
import type { SketchLine } from './sketch-line'

/** What lies at the neck and down the centre of a front: its keyhole, its buttons, its collar. */
export function neckSketch(front: Piece, own: readonly Piece[]): readonly SketchLine[] {
  const keyhole = front.lines.filter(({ id }) => id === 'keyhole').flatMap(({ path }) => both('inner', path))
  const buttons = front.marks
    .filter(({ kind }) => kind === 'button')
    .map(({ at }): SketchLine => ({ kind: 'inner', path: arcPath(at, 9, 0, 360) }))
  return [...keyhole, ...buttons, ...collarSketch(front, own)]
}

function collarSketch(front: Piece, own: readonly Piece[]): readonly SketchLine[] {
  const neck = front.edges.find(({ role }) => role === 'neckline')?.path
  const shoulder = front.edges.find(({ id }) => id === 'shoulder')?.path
  if (!neck || !shoulder) return []
  const stand = own.find(({ id }) => id === 'funnel' || id === 'collar-stand')
  const collar = own.find(({ id }) => id === 'collar')
  const outwards = unit(subtract(endOf(shoulder), startOf(shoulder)))
  const standing = stand ?? (collar?.edges.some(({ id }) => id === 'top') ? collar : undefined)
  const lines: SketchLine[] = standing ? [upright(neck, heightOf(standing))] : []
  if (collar && collar !== standing) lines.push(...falling(neck, outwards, collar))
  return lines
}

/** A stand seen from the front: from the neckline up to a nearly level top. */
function upright(neck: Path, height: number): SketchLine {
  const lower = joinPaths(reversePath(transformPath(mirrorX, neck)), neck)
  const side = endOf(neck)
  const top = { x: side.x - height * 0.12, y: side.y - height }
  const path = closedPath([
    ...lower.segments,
    line(side, top),
    line(top, { x: -top.x, y: top.y }),
    line({ x: -top.x, y: top.y }, startOf(lower)),
  ])
  return { kind: 'shape', path }
}

/** A collar that falls over the front: flat and round where it was drawn on the neckline, with points where it has them. */
function falling(neck: Path, outwards: Point, collar: Piece): readonly SketchLine[] {
  const [centre, side] = [startOf(neck), endOf(neck)]
  const outer = collar.edges.find(({ id }) => id === 'outer')?.path
  const edge = collar.edges.find(({ id }) => id === 'front-edge')?.path
  if (!outer) return []
  const back = reversePath(neck).segments
  if (edge) {
    const long = pathLength(edge)
    const tip = { x: centre.x + long * 0.62, y: centre.y + long * 0.72 }
    const over = add(side, scale(outwards, long * 0.35))
    return both('shape', closedPath([...back, line(centre, tip), line(tip, over), line(over, side)]))
  }
  const met = intersections(outer, openPath([line(side, add(side, scale(outwards, 400)))])).at(-1)
  if (!met) return []
  const round = reversePath(slicePath(outer, met.a, pathLength(outer)))
  return both('shape', closedPath([...back, ...round.segments, line(endOf(round), side)]))
}

function heightOf(piece: Piece): number {
  const { min, max } = bounds(piece.edges.find(({ id }) => id === 'centre-back')?.path ?? piece.cutLine)
  return max.y - min.y
}

const both = (kind: SketchLine['kind'], path: Path): readonly SketchLine[] => [
  { kind, path },
  { kind, path: transformPath(mirrorX, path) },
]

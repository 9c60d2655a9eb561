import type { Edge, Path, Piece, Point } from '../contract'
import {
  closedPath,
  compose,
  endOf,
  rotation,
  startOf,
  transformPath,
  translation,
  type Transform,
  identity,
} from '../geometry'
import { countOf } from './main-pieces'
import type { SketchLine } from './sketch-line'

/** Panels and gores side by side, seam to seam: half of them, as they are seen from the front. */
export function fanned(pieces: readonly Piece[]): readonly SketchLine[] {
  const panels = pieces
    .filter(({ id }) => !id.includes('band'))
    .flatMap((piece) => Array.from({ length: countOf(piece) }, () => piece))
  const seen = panels.slice(0, Math.max(1, Math.round(panels.length / 2)))
  const placed: SketchLine[] = []
  let place: Transform = identity
  let before: Path | undefined
  let start: Path | undefined
  for (const piece of seen) {
    const [left, right] = [sideOf(piece, 'left'), sideOf(piece, 'right')]
    if (before && left) place = laidAlong(before, left.path)
    placed.push({ kind: 'shape', path: transformPath(place, wholeOutline(piece)) })
    start ??= left && transformPath(place, left.path)
    before = right && transformPath(place, right.path)
  }
  return start && before ? upright(placed, downwards(start)[0], downwards(before)[0]) : placed
}

const sideOf = ({ edges }: Piece, side: string): Edge | undefined => edges.find(({ id }) => id === side)

const wholeOutline = ({ edges }: Piece): Path => closedPath(edges.flatMap(({ path }) => path.segments))

/** The move that lays the ends of one edge on those of another, upper end to upper end. */
function laidAlong(onto: Path, edge: Path): Transform {
  const [a, b] = downwards(onto)
  const [c, d] = downwards(edge)
  const turn = ((Math.atan2(b.y - a.y, b.x - a.x) - Math.atan2(d.y - c.y, d.x - c.x)) * 180) / Math.PI
  return compose(translation(a.x - c.x, a.y - c.y), rotation(turn, c))
}

function downwards(path: Path) {
  const [from, to] = [startOf(path), endOf(path)]
  return from.y <= to.y ? ([from, to] as const) : ([to, from] as const)
}

/** Turns a fan so that both ends of its waist lie at one level. */
function upright(lines: readonly SketchLine[], left: Point, right: Point): readonly SketchLine[] {
  const turn = (Math.atan2(right.y - left.y, right.x - left.x) * 180) / Math.PI
  return lines.map((line) => ({ ...line, path: transformPath(rotation(-turn, left), line.path) }))
}

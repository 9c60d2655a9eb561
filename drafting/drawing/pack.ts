import type { Draft, Path, Piece } from '../contract'
import { flatten } from '../geometry/path'
import { rotation, transformPath } from '../geometry/transform'
import type { Place, Places } from './options'
import { outline } from './outline'

export interface PackOptions {
  /** Between pieces, mm. */
  readonly gap: number
  readonly allowances: boolean
  /** How far down the sheet pieces may reach, mm. */
  readonly height: number
  /** Lay pieces on their side, along a roll. Default false: as drawn or on their head. */
  readonly sideways?: boolean
}

type Turn = 0 | 90 | 180 | -90

/** The stretch that something covers in one row, mm. */
interface Span {
  readonly from: number
  readonly to: number
}

/** A piece in one direction as the rows it covers, from its own top row. */
interface Shape {
  readonly turn: Turn
  /** Of its first row, mm in the piece's turned frame. */
  readonly top: number
  readonly rows: readonly Span[]
  readonly left: number
  readonly right: number
}

interface Spot {
  readonly shape: Shape
  readonly x: number
  readonly row: number
}

/** Height of a row, mm: fine enough for paper, coarse enough to be quick. */
const rowHeight = 20
/** Less than this of overlap is the rounding of a sum, mm. */
const touching = 1e-6

/**
 * Lays the pieces on a sheet of paper as close as they go, each as drawn or on its head (or on either side), so that a flare lies
 * against a flare: the largest first, each as far left as it can. On paper the grain does not matter, as pieces are cut out before they are laid
 * on cloth.
 */
export function pack(draft: Draft, options: PackOptions): Places {
  const pieces = draft.pieces.map((piece) => ({ piece, shapes: shapesOf(piece, options) }))
  pieces.sort((a, b) => area(b.shapes) - area(a.shapes))
  const sheetRows = Math.max(1, Math.floor(options.height / rowHeight))
  const taken: Span[][] = Array.from({ length: sheetRows + 200 }, () => [])
  const places: Record<string, Place> = {}
  for (const { piece, shapes } of pieces) {
    const spot = bestSpot(shapes, taken, sheetRows)
    places[piece.id] = placeOf(spot)
    spot.shape.rows.forEach((span, index) => {
      taken[spot.row + index]?.push({ from: spot.x + span.from, to: spot.x + span.to + options.gap })
    })
  }
  return places
}

function placeOf({ shape, x, row }: Spot): Place {
  const place = { x, y: row * rowHeight - shape.top }
  return shape.turn === 0 ? place : { ...place, turn: shape.turn }
}

const area = (shapes: readonly Shape[]) =>
  (shapes[0]?.rows ?? []).reduce((sum, row) => sum + row.to - row.from, 0)

function shapesOf(piece: Piece, { allowances, gap, sideways = false }: PackOptions): readonly Shape[] {
  const path = outline(piece, allowances)
  const turns: readonly Turn[] = sideways ? [-90, 90] : [0, 180]
  return turns.map((turn) =>
    shapeOf(turn === 0 ? path : transformPath(rotation(turn, { x: 0, y: 0 }), path), turn, gap),
  )
}

/** Each row takes whatever lies in it or within the gap above and below it. */
function shapeOf(path: Path, turn: Turn, gap: number): Shape {
  const points = flatten(path, 1)
  const ys = points.map((point) => point.y)
  const top = Math.min(...ys)
  const count = Math.max(1, Math.ceil((Math.max(...ys) - top + gap) / rowHeight))
  const bands = Array.from({ length: count }, (_, index) =>
    spanIn(points, top + index * rowHeight - gap, top + (index + 1) * rowHeight),
  )
  const rows = bands.filter((band) => band.from <= band.to)
  return {
    turn,
    top,
    rows,
    left: Math.min(...rows.map((row) => row.from)),
    right: Math.max(...rows.map((row) => row.to)),
  }
}

function spanIn(points: readonly { x: number; y: number }[], top: number, bottom: number): Span {
  let from = Infinity
  let to = -Infinity
  for (let index = 1; index < points.length; index += 1) {
    const a = points[index - 1]
    const b = points[index]
    if (!a || !b || Math.max(a.y, b.y) < top || Math.min(a.y, b.y) > bottom) continue
    for (const y of [Math.max(top, Math.min(a.y, b.y)), Math.min(bottom, Math.max(a.y, b.y))]) {
      const x = a.y === b.y ? a.x : a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y)
      from = Math.min(from, x)
      to = Math.max(to, x)
    }
    if (a.y === b.y) {
      from = Math.min(from, a.x, b.x)
      to = Math.max(to, a.x, b.x)
    }
  }
  return { from, to }
}

/** The spot that reaches least far to the right; of equals the one furthest up. */
function bestSpot(shapes: readonly Shape[], taken: readonly (readonly Span[])[], sheetRows: number): Spot {
  let best: Spot | null = null
  for (const shape of shapes) {
    const last = Math.max(0, sheetRows - shape.rows.length)
    for (let row = 0; row <= last; row += 1) {
      const x = leftmost(shape, taken, row)
      if (!best || x + shape.right < best.x + best.shape.right - 1) best = { shape, x, row }
    }
  }
  const [first] = shapes
  if (!best && !first) throw new Error('A piece has no shape to lay.')
  return best ?? { shape: first as Shape, x: 0, row: 0 }
}

/** How far left a shape can go with its top in a row, pushed on by whatever lies there already. */
function leftmost(shape: Shape, taken: readonly (readonly Span[])[], row: number): number {
  let x = -shape.left
  for (let moved = true; moved;) {
    moved = false
    for (let index = 0; index < shape.rows.length; index += 1) {
      const own = shape.rows[index]
      for (const span of taken[row + index] ?? []) {
        if (!own || x + own.from >= span.to - touching || x + own.to <= span.from + touching) continue
        x = span.to - own.from
        moved = true
      }
    }
  }
  return x
}

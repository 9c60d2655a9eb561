import type {
  Draft,
  Drawing,
  DrawingItem,
  Nest,
  NestedPiece,
  NestedSize,
  Path,
  Piece,
  Point,
} from '../contract'
import { flatten, pathLength, polyline } from '../geometry/path'
import { hull } from '../geometry/hull'
import { add, distance, perpendicular, scale } from '../geometry/point'
import { boundsOf } from './bounds'
import { foldItems } from './fold-items'
import { grainItems } from './grain-items'
import { innerItems } from './inner-items'
import { pathItem, textItem } from './items'
import { labelItems } from './label-items'
import { layers } from './layers'
import { markItems } from './mark-items'
import { notchItems } from './notch-items'
import type { DrawingOptions } from './options'
import { outline } from './outline'
import { cutItems, stitchItems } from './outline-items'
import { placeItem, placePath, readable } from './place'
import { spotOn } from './spot'
import type { StyleName } from './styles'

interface Sized {
  readonly size: NestedSize
  readonly piece: Piece
  readonly shift: { readonly x: number; readonly y: number }
}

function sizesOf(nest: Nest, { id, shifts }: NestedPiece): readonly Sized[] {
  return nest.sizes.flatMap((size) => {
    const piece = size.draft.pieces.find((one) => one.id === id)
    const shift = shifts[size.id]
    return piece && shift ? [{ size, piece, shift }] : []
  })
}

/**
 * The display list of a nest: every size's outline, darts and notches in its own line and with its name beside it; grain,
 * folds, inner lines, drill points and label once.
 */
export function nestDrawing(nest: Nest, options: DrawingOptions = {}): Drawing {
  const items = nest.pieces.flatMap((piece) =>
    itemsOf(nest, piece, options).map((item) => placeItem(item, options.places?.[piece.id])),
  )
  const order = layers.flatMap((layer) => items.filter((item) => item.layer === layer))
  return { items: order, bounds: boundsOf(order) }
}

function itemsOf(nest: Nest, nested: NestedPiece, options: DrawingOptions): readonly DrawingItem[] {
  const sized = sizesOf(nest, nested)
  const still = sized.find(({ size }) => size.id === nested.base)
  if (!still) return []
  const { draft } = still.size
  const once = [innerItems, grainItems, markItems, labelItems].flatMap((paint) =>
    paint(still.piece, draft, options),
  )
  const folds = longestFold(sized)
  const edge = widestEdge(sized, options)
  return [
    ...once,
    ...(folds ? foldItems(folds.piece, draft, options).map((item) => placeItem(item, folds.shift)) : []),
    ...sized.flatMap((one) => (folds ? foldBeside(one, folds) : [])),
    ...sized.flatMap((one, index) => linesOf(one, { edge, along: share(index, sized.length) }, options)),
  ]
}

/** Names are staggered over the middle of their edge, so that none stands on the next line. */
const share = (index: number, of: number): number => 0.25 + (0.5 * (index + 0.5)) / of

/** The fold of the size that runs farthest along it: the others lie on the same line when they are aligned on it. */
function longestFold(sized: readonly Sized[]): Sized | undefined {
  const long = ({ piece }: Sized): number =>
    piece.edges.filter(({ role }) => role === 'fold').reduce((sum, edge) => sum + pathLength(edge.path), 0)
  return sized.reduce<Sized | undefined>(
    (best, one) => (!best || long(one) > long(best) ? one : best),
    undefined,
  )
}

/** The fold of a size that does not lie on the longest one, because the sizes are aligned elsewhere. */
function foldBeside({ size, piece, shift }: Sized, longest: Sized): readonly DrawingItem[] {
  if (Math.abs(shift.x - longest.shift.x) < 0.05) return []
  return piece.edges
    .filter(({ role }) => role === 'fold')
    .map(({ id, path }) => pathItem(piece, 'fold', `${id}/${size.id}`, size.style as StyleName, path))
    .map((item) => placeItem(item, shift))
}

/** Outline, dart legs and notches of one size, and its name at a share of the way along an edge. */
function linesOf(sized: Sized, name: NamePlace, options: DrawingOptions): readonly DrawingItem[] {
  const { size, piece, shift } = sized
  const { draft, style } = size
  const nett = options.allowances === false
  const darts = stitchItems(piece, draft, options).filter(
    (item) => nett || piece.edges.some((edge) => edge.role === 'dart' && item.id?.endsWith(`/${edge.id}`)),
  )
  const lines = [...cutItems(piece, draft, options), ...darts].map((item) => ({ ...item, style }))
  const all = [...lines, ...notchItems(piece, draft, options), nameOf(sized, name, options)]
  return all.map((item) => placeItem({ ...item, id: `${item.id}/${size.id}` }, shift))
}

/** Where the name of a size stands: on which edge, and at what share of the way along it. */
interface NamePlace {
  readonly edge: string
  readonly along: number
}

const drawnLine = (piece: Piece, id: string, options: DrawingOptions): Path | undefined => {
  const edge = piece.edges.find((one) => one.id === id)
  return edge && (options.allowances === false ? edge.path : edge.cut)
}

/** Names stand where the lines lie farthest apart: on the edge whose middle moves most from the first size to the last. */
function widestEdge(sized: readonly Sized[], options: DrawingOptions): string {
  const [first, last] = [sized[0] as Sized, sized.at(-1) as Sized]
  const middle = ({ piece, shift }: Sized, id: string): Point | undefined => {
    const path = drawnLine(piece, id, options)
    return path && add(spotOn(path, pathLength(path) / 2).point, shift)
  }
  const edges = first.piece.edges.filter(({ role }) => role !== 'fold' && role !== 'dart')
  const spread = edges.map(({ id }) => {
    const [from, to] = [middle(first, id), middle(last, id)]
    return { id, apart: from && to ? distance(from, to) : 0 }
  })
  return spread.reduce((best, one) => (one.apart > best.apart + 0.1 ? one : best)).id
}

/** Inside the line, mm. */
const inside = 1.2

function nameOf({ size, piece }: Sized, { edge, along }: NamePlace, options: DrawingOptions): DrawingItem {
  const path = drawnLine(piece, edge, options) ?? outline(piece, options.allowances !== false)
  const { point, tangent } = spotOn(path, pathLength(path) * along)
  const em = 3.5 * (options.textScale ?? 1)
  const at = add(point, scale(perpendicular(tangent), inside + em / 2))
  const turn = readable((Math.atan2(tangent.y, tangent.x) * 180) / Math.PI)
  return textItem(piece, 'label', 'size', 'label', size.name, at, em, turn)
}

/**
 * A draft whose pieces are the room that each piece of a nest takes in all its sizes: what is laid on paper. It can be
 * packed and listed, not sewn.
 */
export function nestRoom(nest: Nest, allowances: boolean): Draft {
  const pieces = nest.pieces.flatMap((nested): readonly Piece[] => {
    const sized = sizesOf(nest, nested)
    const still = sized.find(({ size }) => size.id === nested.base)?.piece
    if (!still) return []
    const points = sized.flatMap(({ piece, shift }) =>
      flatten(placePath(outline(piece, allowances), shift), 0.5),
    )
    const corners = hull(points)
    const around: Path = { ...polyline([...corners, corners[0] ?? { x: 0, y: 0 }]), closed: true }
    const edge = { ...(still.edges[0] as Piece['edges'][number]), id: 'around', path: around, cut: around }
    return [{ ...still, edges: [edge], cutLine: around, notches: [], darts: [], lines: [] }]
  })
  const first = nest.sizes[0] as NestedSize
  return { ...first.draft, pieces, seams: [], steps: [], dimensions: [] }
}

import type { Draft, Drawing, Nest, Path } from '../contract'
import { bounds, flatten } from '../geometry/path'
import { arrange } from './arrange'
import { boundsOfPoints } from './bounds'
import { drawing } from './drawing'
import { labelsOffJoins } from './label-joins'
import { printLayers } from './layers'
import { nestDrawing } from './nest-drawing'
import type { DrawingOptions, Places, TitleBlock } from './options'
import { outline } from './outline'
import { pack } from './pack'
import type { Paper } from './papers'
import { placePath } from './place'
import { printScales, safeMargin, stretchDrawing, stretchOf, stretchPath, trueMeasure } from './print-scale'
import type { Measured, PrintScale, Stretch } from './print-scale'
import { tilePages } from './tile-pages'
import type { Join, Orientation, Tiling } from './tiling'

export interface LayOutRequest {
  readonly draft: Draft
  /** Drawn in the place of the draft, which is then the room that it takes: see nestRoom. */
  readonly nest?: Nest
  /** Of the labels on the pieces. */
  readonly title?: TitleBlock
  readonly paper: Paper
  readonly orientation: Orientation
  readonly allowances: boolean
  /** Default 'full'. */
  readonly scale?: PrintScale
  /** What the printer makes of 100 mm; the pattern is drawn the inverse of it. Default: a true printer. */
  readonly measured?: Measured
  /** Ids of the pieces that are wanted. Default: all. */
  readonly pieces?: readonly string[]
  /** Default 'trim'. */
  readonly join?: Join
  /** Edge that stays free on the printed sheet, mm. Default 10. */
  readonly margin?: number
}

export interface LaidOut {
  /** As it is drawn on the sheets: stretched for the printer, at its scale. */
  readonly drawing: Drawing
  readonly tiling: Tiling
  /** What each piece is cut along, as it lies on the sheet. */
  readonly outlines: readonly Path[]
  /** Sheets that it would take if the pieces lay as they do in the studio. */
  readonly unpacked: number
}

/** Heights of the sheet that are tried, as multiples of the tallest piece. */
const heights = [1, 1.1, 1.2, 1.35, 1.5, 1.75, 2, 2.3]
/** Between pieces on paper, mm. */
const gap = 15
/** While ways are compared, outlines may be this far off, mm. */
const roughly = 1

/** A way of laying the pieces, with the sheets that it takes. */
interface Way {
  readonly places: Places
  readonly orientation: 'portrait' | 'landscape'
  readonly count: number
  /** How far the sheet runs, mm: of a roll, what is used up. */
  readonly length: number
}

/** Lays the pieces on the sheet and cuts it into pages, in the way that takes the fewest of those tried. */
export function layOut(asked: LayOutRequest): LaidOut {
  const request = { ...asked, draft: chosenPieces(asked) }
  const { draft, allowances, title } = request
  const tried = tries(request)
  const unpacked = tried.filter((way) => way.places === tried[0]?.places)
  const best = tried.reduce((before, next) => (isBetter(next, before) ? next : before), none)
  const stretch = stretchFor(request, best.orientation)
  const options: DrawingOptions = {
    layers: printLayers,
    allowances,
    places: best.places,
    title,
    // Labels stay as large on the paper as they are at full size.
    textScale: 1 / printScales[request.scale ?? 'full'],
  }
  const full = request.nest ? nestDrawing(chosenOf(request.nest, draft), options) : drawing(draft, options)
  const laid = stretchDrawing(full, stretch)
  const outlines = outlinesAt(request, best)
  const regions = outlines.map((path) => flatten(path))
  const tiling = tilingOf(request, best.orientation, laid, regions)
  const byPiece = new Map(draft.pieces.map((piece, index) => [piece.id, regions[index] ?? []]))
  return {
    drawing: labelsOffJoins(laid, tiling, byPiece),
    tiling,
    outlines,
    unpacked: Math.min(...unpacked.map(({ count }) => count)),
  }
}

const none: Way = { places: {}, orientation: 'portrait', count: Infinity, length: Infinity }

function chosenPieces({ draft, pieces }: LayOutRequest): Draft {
  if (!pieces) return draft
  return { ...draft, pieces: draft.pieces.filter(({ id }) => pieces.includes(id)) }
}

/** The pieces of a nest that are laid. */
function chosenOf(nest: Nest, { pieces }: Draft): Nest {
  return { ...nest, pieces: nest.pieces.filter(({ id }) => pieces.some((piece) => piece.id === id)) }
}

const isBetter = (a: Way, b: Way) => a.count < b.count || (a.count === b.count && a.length < b.length - 1)

const isRoll = ({ paper }: LayOutRequest) => paper.id === 'roll'

function orientationsOf(request: LayOutRequest): readonly ('portrait' | 'landscape')[] {
  if (isRoll(request)) return ['landscape']
  return request.orientation === 'fewest' ? ['portrait', 'landscape'] : [request.orientation]
}

function stretchFor(
  { measured = trueMeasure, scale = 'full' }: LayOutRequest,
  orientation: 'portrait' | 'landscape',
): Stretch {
  return stretchOf(measured, scale, orientation)
}

const marginOf = ({ paper, measured = trueMeasure, margin = 10 }: LayOutRequest) =>
  safeMargin(paper.id === 'roll' ? { ...paper, height: paper.width } : paper, measured, margin)

/** The ways of laying the pieces that are tried, first of all as they lie in the studio, counted by their outlines alone. */
function tries(request: LayOutRequest): readonly Way[] {
  const { draft, allowances, scale = 'full' } = request
  const tallest = Math.max(...draft.pieces.map((piece) => heightOf(outline(piece, allowances))))
  const apart = gap / printScales[scale]
  const packed = (height: number, sideways = false) =>
    pack(draft, { gap: apart, allowances, height, sideways })
  const layings = [
    arrange(draft, { allowances }),
    ...(isRoll(request) ? [packed(acrossRoll(request)), packed(acrossRoll(request), true)] : []),
    ...heights.map((height) => packed(tallest * height + 2 * apart)),
  ]
  return layings.flatMap((places) =>
    orientationsOf(request).map((orientation): Way => {
      const regions = outlinesAt(request, { places, orientation }).map((path) => flatten(path, roughly))
      const box = boundsOfPoints(regions.flat())
      const { pages } = tilingOf(request, orientation, { items: [], bounds: box }, regions)
      const count = pages.filter((page) => !page.blank).length
      return { places, orientation, count, length: isRoll(request) ? box.max.x - box.min.x : 0 }
    }),
  )
}

/** What lies across a roll, in millimetres of the draft. */
function acrossRoll(request: LayOutRequest): number {
  return (request.paper.width - 2 * marginOf(request) - 2) / stretchFor(request, 'landscape').y
}

function tilingOf(
  request: LayOutRequest,
  orientation: 'portrait' | 'landscape',
  laid: Drawing,
  regions: Parameters<typeof tilePages>[1]['regions'],
): Tiling {
  const margin = marginOf(request)
  const { paper, join } = request
  const { min, max } = laid.bounds
  // Of a roll no more is cut off than the pattern takes.
  const used = Math.min(paper.height, Math.ceil(max.x - min.x + 2 * margin + 2))
  const sheet = isRoll(request) ? { ...paper, height: Math.max(used, 100) } : paper
  return tilePages(laid, { paper: sheet, orientation, regions, margin, join })
}

function outlinesAt(
  request: LayOutRequest,
  { places, orientation }: Pick<Way, 'places' | 'orientation'>,
): readonly Path[] {
  const stretch = stretchFor(request, orientation)
  return request.draft.pieces.map((piece) =>
    stretchPath(placePath(outline(piece, request.allowances), places[piece.id]), stretch),
  )
}

function heightOf(path: Path): number {
  const { min, max } = bounds(path)
  return max.y - min.y
}

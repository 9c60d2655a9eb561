import type { Draft, Drawing, Path } from '../contract'
import { bounds, flatten } from '../geometry/path'
import { boundsOfPoints } from './bounds'
import { drawing } from './drawing'
import { printLayers } from './layers'
import type { Places, TitleBlock } from './options'
import type { Paper } from './papers'
import { placePath } from './place'
import { outline } from './outline'
import { pack } from './pack'
import { tilePages } from './tile-pages'
import type { Orientation, Tiling } from './tiling'

export interface LayOutRequest {
  readonly draft: Draft
  /** Of the labels on the pieces. */
  readonly title?: TitleBlock
  readonly paper: Paper
  readonly orientation: Orientation
  readonly allowances: boolean
}

export interface LaidOut {
  readonly drawing: Drawing
  readonly tiling: Tiling
  /** What each piece is cut along, as it lies on the sheet. */
  readonly outlines: readonly Path[]
}

/** Heights of the sheet that are tried, as multiples of the tallest piece. */
const heights = [1, 1.1, 1.2, 1.35, 1.5, 1.75, 2, 2.3]
/** Between pieces, mm. */
const gap = 15
/** While ways are compared, outlines may be this far off, mm. */
const roughly = 1

/** Lays the pieces on the sheet and cuts it into pages, in the way that takes the fewest of those tried. */
export function layOut(request: LayOutRequest): LaidOut {
  const { draft, allowances, title } = request
  const places = fewestSheets(request)
  const laid = drawing(draft, { layers: printLayers, allowances, places, title })
  const outlines = outlinesAt(request, places)
  const regions = outlines.map((path) => flatten(path))
  const tiling = tilePages(laid, { paper: request.paper, orientation: request.orientation, regions })
  return { drawing: laid, tiling, outlines }
}

/** The places of the pieces for which the outlines alone touch the fewest pages. */
function fewestSheets(request: LayOutRequest): Places {
  const { draft, allowances, paper, orientation } = request
  const tallest = Math.max(...draft.pieces.map((piece) => heightOf(outline(piece, allowances))))
  let best: { places: Places; count: number } | null = null
  for (const height of heights) {
    const places = pack(draft, { gap, allowances, height: tallest * height + 2 * gap })
    const regions = outlinesAt(request, places).map((path) => flatten(path, roughly))
    const bare = { items: [], bounds: boundsOfPoints(regions.flat()) }
    const { pages } = tilePages(bare, { paper, orientation, regions })
    const count = pages.filter((page) => !page.blank).length
    if (!best || count < best.count) best = { places, count }
  }
  return best?.places ?? {}
}

function outlinesAt({ draft, allowances }: LayOutRequest, places: Places): readonly Path[] {
  return draft.pieces.map((piece) => placePath(outline(piece, allowances), places[piece.id]))
}

function heightOf(path: Path): number {
  const { min, max } = bounds(path)
  return max.y - min.y
}

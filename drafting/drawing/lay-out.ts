import type { Draft, Drawing, Path } from '../contract'
import { bounds, flatten } from '../geometry/path'
import { arrange } from './arrange'
import { drawing } from './drawing'
import { printLayers } from './layers'
import type { TitleBlock } from './options'
import type { Paper } from './papers'
import { placePath } from './place'
import { outline } from './outline'
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
const heights = [1, 1.2, 1.45, 1.75, 2.1]

/** Lays the pieces on the sheet and cuts it into pages, in the way that takes the fewest. */
export function layOut(request: LayOutRequest): LaidOut {
  const { draft, allowances } = request
  const tallest = Math.max(
    ...draft.pieces.map((piece) => {
      const { min, max } = bounds(outline(piece, allowances))
      return max.y - min.y
    }),
  )
  const tried = heights.map((height) => layOutAt(request, tallest * height + 60))
  return tried.reduce((best, next) => (sheets(next.tiling) < sheets(best.tiling) ? next : best))
}

const sheets = (tiling: Tiling) => tiling.pages.filter((page) => !page.blank).length

function layOutAt(request: LayOutRequest, height: number): LaidOut {
  const { draft, allowances, title } = request
  const places = arrange(draft, { gap: 15, allowances, height })
  const laid = drawing(draft, { layers: printLayers, allowances, places, title })
  const outlines = draft.pieces.map((piece) => placePath(outline(piece, allowances), places[piece.id]))
  const regions = outlines.map((path) => flatten(path))
  const tiling = tilePages(laid, { paper: request.paper, orientation: request.orientation, regions })
  return { drawing: laid, tiling, outlines }
}

import type { Draft, Drawing, DrawingItem, Piece } from '../contract'
import { arrange } from './arrange'
import { boundsOf } from './bounds'
import { constructionItems } from './construction-items'
import { dimensionItems } from './dimension-items'
import { fillItems } from './fill-items'
import { foldItems } from './fold-items'
import { grainItems } from './grain-items'
import { innerItems } from './inner-items'
import { labelItems } from './label-items'
import { layers, patternLayers } from './layers'
import type { Layer } from './layers'
import { markItems } from './mark-items'
import { notchItems } from './notch-items'
import type { DrawingOptions } from './options'
import { cutItems, stitchItems } from './outline-items'
import { itemPlacer } from './place'

/** What one layer of one piece shows, in the piece's own frame. */
type Painter = (piece: Piece, draft: Draft, options: DrawingOptions) => readonly DrawingItem[]

const painters: Readonly<Record<Layer, Painter>> = {
  fill: fillItems,
  'allowance-fill': fillItems,
  construction: constructionItems,
  inner: innerItems,
  grain: grainItems,
  stitch: stitchItems,
  fold: foldItems,
  cut: cutItems,
  notch: notchItems,
  mark: markItems,
  dimension: dimensionItems,
  label: labelItems,
}

/**
 * The display list of a draft: the one source for the canvas, SVG, PDF and review pictures.
 *
 * @param options layers, allowances or nett, where pieces lie, unit, title block; see DrawingOptions.
 * @returns items from the bottom layer up, mm, with ids that are unique in the drawing and the same across redraws:
 *   '<piece>/<layer>/<thing>'; and the bounds of everything drawn.
 */
export function drawing(draft: Draft, options: DrawingOptions = {}): Drawing {
  const places = options.places ?? arrange(draft, { allowances: options.allowances ?? true })
  const wanted = options.layers ?? patternLayers
  const laid = draft.pieces.map((piece) => ({ piece, place: itemPlacer(places[piece.id]) }))
  const items: DrawingItem[] = []
  for (const layer of layers) {
    if (!wanted.includes(layer)) continue
    for (const { piece, place } of laid)
      for (const item of painters[layer](piece, draft, options))
        if (item.layer === layer) items.push(place(item))
  }
  return { items, bounds: boundsOf(items) }
}

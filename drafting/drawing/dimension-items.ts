import type { Dimension, Draft, DrawingItem, Piece } from '../contract'
import { formatLength } from '../lengths'
import { polyline } from '../geometry/path'
import { add, distance, lerp, perpendicular, scale, subtract, unit } from '../geometry/point'
import { pathItem, textItem } from './items'
import type { DrawingOptions } from './options'
import { readable } from './place'
import { typesetFractions } from './typeset'

/** mm; less is nothing that could be seen. */
const shortest = 0.5
/** mm; the middle of longer ones is left to the words on the fold, which they often run along. */
const longLine = 300

/** The lengths a drafter would write on the drawing, in the wanted unit. */
export function dimensionItems(piece: Piece, draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  return draft.dimensions
    .filter((dimension) => dimension.piece === piece.id && dimension.length >= shortest)
    .flatMap((dimension) => dimensionOf(piece, dimension, options))
}

function dimensionOf(piece: Piece, dimension: Dimension, options: DrawingOptions): readonly DrawingItem[] {
  const { from, to } = dimension
  const text = typesetFractions(formatLength(dimension.length, options.unit ?? 'cm'))
  const line = pathItem(piece, 'dimension', dimension.id, 'dimension', polyline([from, to]))
  const size = 5.5 * (options.textScale ?? 1)
  const long = distance(from, to)
  const along = long > 1 ? unit(subtract(to, from)) : { x: 1, y: 0 }
  const turn = readable((Math.atan2(along.y, along.x) * 180) / Math.PI)
  const up = perpendicular({ x: -Math.cos((turn * Math.PI) / 180), y: -Math.sin((turn * Math.PI) / 180) })
  const at = add(lerp(from, to, long > longLine ? 0.3 : 0.5), scale(up, size * 0.27))
  const label = textItem(piece, 'dimension', `${dimension.id}-text`, 'dimension-text', text, at, size, turn)
  return long > 1 ? [line, label] : [label]
}

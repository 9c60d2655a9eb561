import type { Draft, DrawingItem, Piece } from '../contract'
import { polyline } from '../geometry/path'
import { add, distance, lerp, perpendicular, scale, subtract, unit } from '../geometry/point'
import { arrowhead } from './arrowhead'
import { pathItem, textItem } from './items'
import type { DrawingOptions } from './options'
import { readable } from './place'

/** A thin double arrow along the grain: either end of the cloth may be up. */
export function grainItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  const { from, to } = piece.grain
  const length = distance(from, to)
  if (length < 1) return []
  const along = unit(subtract(to, from))
  const head = Math.min(7, length / 5)
  const shaft = polyline([add(from, scale(along, head / 2)), subtract(to, scale(along, head / 2))])
  const items: DrawingItem[] = [
    pathItem(piece, 'grain', 'line', 'grain', shaft),
    pathItem(piece, 'grain', 'head', 'arrowhead', arrowhead(to, along, head, head * 0.45)),
    pathItem(piece, 'grain', 'tail', 'arrowhead', arrowhead(from, scale(along, -1), head, head * 0.45)),
  ]
  if (length > 60) items.push(grainText(piece, length, options.textScale ?? 1))
  return items
}

function grainText(piece: Piece, length: number, textScale: number): DrawingItem {
  const { from, to } = piece.grain
  const degrees = readable((Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI)
  // Above the line as one reads it: the text's own upward direction.
  const up = scale(
    perpendicular({ x: Math.cos((degrees * Math.PI) / 180), y: Math.sin((degrees * Math.PI) / 180) }),
    -1,
  )
  const at = add(lerp(from, to, 0.82), scale(up, 1.6 * textScale))
  return textItem(
    piece,
    'grain',
    'text',
    'label-small',
    'straight grain',
    at,
    Math.min(4 * textScale, length / 18),
    degrees,
  )
}

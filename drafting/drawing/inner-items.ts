import type { Draft, DrawingItem, InnerLine, Piece } from '../contract'
import { pathItem } from './items'
import type { StyleName } from './styles'

const styleOfLine: Readonly<Record<InnerLine['kind'], StyleName>> = {
  level: 'inner',
  placement: 'inner',
  turn: 'turn',
  pleat: 'turn',
  gather: 'gather',
}

/** Levels, turns, gathers and placements, and the legs of darts that lie inside the piece. */
export function innerItems(piece: Piece, _draft: Draft): readonly DrawingItem[] {
  const lines = piece.lines.map((line) =>
    pathItem(piece, 'inner', line.id, styleOfLine[line.kind], line.path),
  )
  const legs = piece.darts
    .filter((dart) => !dart.edges)
    .flatMap((dart) =>
      dart.legs.map((leg, index) => pathItem(piece, 'inner', `${dart.id}-leg-${index + 1}`, 'stitch', leg)),
    )
  return [...lines, ...legs]
}

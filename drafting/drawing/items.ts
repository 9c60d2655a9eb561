import type { DrawingItem, Path, Piece, Point } from '../contract'
import type { Layer } from './layers'
import type { StyleName } from './styles'

/** A drawn path of a piece. `thing` names it within its piece and layer. */
export function pathItem(
  piece: Piece,
  layer: Layer,
  thing: string,
  style: StyleName,
  path: Path,
): DrawingItem {
  return { kind: 'path', path, layer, style, piece: piece.id, id: `${piece.id}/${layer}/${thing}` }
}

/** A text of a piece, centred on `at`; `size` is the em in mm, `turn` degrees clockwise. */
export function textItem(
  piece: Piece,
  layer: Layer,
  thing: string,
  style: StyleName,
  text: string,
  at: Point,
  size: number,
  turn = 0,
): DrawingItem {
  return {
    kind: 'text',
    text,
    at,
    turn,
    size,
    layer,
    style,
    piece: piece.id,
    id: `${piece.id}/${layer}/${thing}`,
  }
}

import type { Path, Piece } from '../contract'
import { stitchLine } from '../pieces/stitch-line'

/** What a piece is cut along: its cut line, or its stitch line when the pattern is nett. */
export function outline(piece: Piece, allowances: boolean): Path {
  return allowances ? piece.cutLine : stitchLine(piece)
}

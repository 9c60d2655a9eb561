import type { Path, Piece } from '../contract'

/** The closed stitch line of a piece, from its edges in order. */
export function stitchOutline(piece: Piece): Path {
  return { segments: piece.edges.flatMap((edge) => edge.path.segments), closed: true }
}

/** What a piece is cut along: its cut line, or its stitch line when the pattern is nett. */
export function outline(piece: Piece, allowances: boolean): Path {
  return allowances ? piece.cutLine : stitchOutline(piece)
}

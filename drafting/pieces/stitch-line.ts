import type { Path, Piece } from '../contract'
import { closedPath } from '../geometry'

/** The whole stitch line of a piece: its edges in order, closed, clockwise. */
export function stitchLine(piece: Piece): Path {
  return closedPath(piece.edges.flatMap((edge) => edge.path.segments))
}

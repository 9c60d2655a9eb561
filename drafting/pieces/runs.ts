import type { Path, Piece, Run } from '../contract'
import { pathLength, slicePath } from '../geometry'

/** The pieces of a draft by id. */
export type PieceById = ReadonlyMap<string, Piece>

/** Length of one run, mm. Throws when the seam names what is not there: that is a fault of the garment, not of the order. */
export function runLength(run: Run, pieces: PieceById): number {
  const edge = pieces.get(run.piece)?.edges.find((one) => one.id === run.edge)
  if (!edge) throw new Error(`A seam names ${run.piece}.${run.edge}, which was not drawn.`)
  const whole = pathLength(edge.path)
  return (run.to ?? whole) - (run.from ?? 0)
}

/** Length of one side of a seam, mm. Throws like runLength. */
export function runsLength(runs: readonly Run[], pieces: PieceById): number {
  return runs.reduce((sum, run) => sum + runLength(run, pieces), 0)
}

/** The stretch of an edge that a run names, in its piece's frame; nothing when the piece is not in the draft. */
export function runPath({ piece, edge, from = 0, to = Infinity }: Run, pieces: PieceById): Path | undefined {
  const path = pieces.get(piece)?.edges.find((one) => one.id === edge)?.path
  if (!path || (from === 0 && to === Infinity)) return path
  return slicePath(path, from, Math.min(to, pathLength(path)))
}

/** The pieces of a draft by id. */
export function piecesById(pieces: readonly Piece[]): PieceById {
  return new Map(pieces.map((piece) => [piece.id, piece]))
}

/** Where a distance along several runs falls: the run's edge and the distance along that edge, mm. */
export function placeOnRuns(
  runs: readonly Run[],
  along: number,
  pieces: PieceById,
): { readonly piece: string; readonly edge: string; readonly at: number } | undefined {
  let rest = along
  for (const [index, run] of runs.entries()) {
    const length = runLength(run, pieces)
    if (rest > length + 1e-6 && index < runs.length - 1) {
      rest -= length
      continue
    }
    const from = run.from ?? 0
    const within = Math.min(Math.max(rest, 0), length)
    return { piece: run.piece, edge: run.edge, at: run.reversed ? from + length - within : from + within }
  }
  return undefined
}

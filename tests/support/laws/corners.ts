import type { Draft, Edge, Piece, Run, SeamCheck } from '@/drafting/contract'
import { headingAtEnd, headingAtStart, lengthOfPath, turnFrom } from './curves'

/** The angle inside a piece at the corner where an edge starts, degrees, 0…360. */
export function angleAtStart(piece: Piece, index: number): number {
  const edge = piece.edges[index] as Edge
  const before = piece.edges[(index + piece.edges.length - 1) % piece.edges.length] as Edge
  // Clockwise on the sheet the piece lies on the right, so a turn to the right closes the corner.
  return 180 - turnFrom(headingAtEnd(before.path), headingAtStart(edge.path))
}

/** One end of a sewn edge: the corner there and the edge beyond it. */
export interface SewnEnd {
  readonly piece: Piece
  readonly edge: Edge
  readonly beyond: Edge
  readonly angle: number
}

/** The ends of a run that lie at the ends of its edge, in sewing order; undefined where it ends within the edge. */
function endsOf(draft: Draft, run: Run): readonly [SewnEnd | undefined, SewnEnd | undefined] {
  const piece = draft.pieces.find((one) => one.id === run.piece)
  const index = piece?.edges.findIndex((one) => one.id === run.edge) ?? -1
  const edge = piece?.edges[index]
  if (!piece || !edge) return [undefined, undefined]
  const count = piece.edges.length
  const after = (index + 1) % count
  const whole = lengthOfPath(edge.path)
  const start =
    (run.from ?? 0) < 0.01
      ? {
          piece,
          edge,
          beyond: piece.edges[(index + count - 1) % count] as Edge,
          angle: angleAtStart(piece, index),
        }
      : undefined
  const end =
    Math.abs((run.to ?? whole) - whole) < 0.01
      ? { piece, edge, beyond: piece.edges[after] as Edge, angle: angleAtStart(piece, after) }
      : undefined
  return run.reversed ? [end, start] : [start, end]
}

/** Corners of two pieces that a seam brings together, where the same kind of edge goes on from one to the other. */
export function* corners(
  draft: Draft,
  seam: SeamCheck,
): Generator<{ readonly where: string; readonly a: SewnEnd; readonly b: SewnEnd }> {
  const [firstA, lastA] = [seam.a[0], seam.a[seam.a.length - 1]]
  const [firstB, lastB] = [seam.b[0], seam.b[seam.b.length - 1]]
  if (!firstA || !lastA || !firstB || !lastB) return
  const pairs = [
    ['start', endsOf(draft, firstA)[0], endsOf(draft, firstB)[0]],
    ['end', endsOf(draft, lastA)[1], endsOf(draft, lastB)[1]],
  ] as const
  for (const [where, a, b] of pairs) {
    if (a && b && a.beyond.role === b.beyond.role)
      yield { where: `${seam.id}, ${where}, at the ${a.beyond.role}`, a, b }
  }
}

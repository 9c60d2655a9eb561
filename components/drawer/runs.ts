import type { Draft, Path, Run, SeamCheck } from '@/drafting/contract'
import { pathLength, slicePath } from '@/drafting/geometry/path'

/** The stretch of an edge that a run names, in its piece's frame; nothing when the piece is not in the draft. */
export function runPath(draft: Draft, run: Run): Path | undefined {
  const edge = draft.pieces
    .find((piece) => piece.id === run.piece)
    ?.edges.find((each) => each.id === run.edge)
  if (!edge) return undefined
  if (run.from === undefined && run.to === undefined) return edge.path
  const length = pathLength(edge.path)
  return slicePath(edge.path, run.from ?? 0, Math.min(length, run.to ?? length))
}

/** Length of one side of a seam, mm. */
export function runsLength(draft: Draft, runs: readonly Run[]): number {
  return runs.reduce((sum, run) => {
    const path = runPath(draft, run)
    return path ? sum + pathLength(path) : sum
  }, 0)
}

/** More than this apart, mm, a seam does not sew together. */
export const seamTolerance = 0.5

/** Whether the two sides of a seam come out as they are meant to. */
export function seamAgrees(seam: SeamCheck): boolean {
  return Math.abs(seam.difference) <= seamTolerance
}

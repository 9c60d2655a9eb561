import type { Draft, Run } from '@/drafting/contract'
import type { Emphasis } from '@/components/sheet/stage'
import { piecesById, runPath } from '@/drafting/pieces/runs'

/** Both sides of a chosen seam, or the lines along which a chosen fit is measured. */
export function chosenEmphasis(draft: Draft, chosen: string | undefined): readonly Emphasis[] {
  if (!chosen) return []
  const id = chosen.slice(chosen.indexOf(':') + 1)
  if (chosen.startsWith('seam:')) {
    const seam = draft.seams.find((each) => each.id === id)
    if (!seam) return []
    return [...side(draft, seam.a, 'first-edge'), ...side(draft, seam.b, 'second-edge')]
  }
  const fit = draft.fits.find((each) => each.id === id)
  return (fit?.across ?? []).map(({ piece, path }, index) => ({
    id: `${id}:${index}`,
    piece,
    path,
    kind: 'measured',
  }))
}

function side(draft: Draft, runs: readonly Run[], kind: Emphasis['kind']): readonly Emphasis[] {
  const pieces = piecesById(draft.pieces)
  return runs.flatMap((run, index) => {
    const path = runPath(run, pieces)
    return path ? [{ id: `${run.piece}/${run.edge}:${index}`, piece: run.piece, path, kind }] : []
  })
}

/** The draft as far as a step: all lines drawn before it, and its own brought out. */
export function stepEmphasis(draft: Draft, at: number): readonly Emphasis[] {
  return draft.steps.slice(0, at + 1).flatMap((step, index) =>
    step.draws.map((path, number) => ({
      id: `${step.id}:${number}`,
      piece: step.piece,
      path,
      kind: index === at ? ('step-now' as const) : ('step-done' as const),
    })),
  )
}

import type { Notch, Piece, SeamCheck } from '../contract'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { cutLine } from './cut-line'
import { checkSeam, notchesOf } from './seams'

/** Adds allowances to what was drawn. An allowance wider than its curve is said as a caution. */
function finishPiece(drawn: PiecePen, pen: Pen): Piece {
  const cut = cutLine(drawn.edges, drawn.darts)
  for (const edge of cut.clipped) {
    pen.caution(
      'allowance-clipped',
      `The allowance along the ${edge} of the ${drawn.name.toLowerCase()} is wider than its curve allows, so the cut line takes the corner short. Choose a narrower allowance there.`,
      edge,
    )
  }
  return {
    id: drawn.id,
    name: drawn.name,
    edges: drawn.edges.map(({ uses: _uses, ...edge }, index) => {
      const own = cut.cuts[index]
      if (!own) throw new Error(`The edge ${edge.id} of ${drawn.id} has no cut line.`)
      return { ...edge, cut: own }
    }),
    cutLine: cut.cutLine,
    grain: drawn.grainLine ?? { from: { x: 0, y: 0 }, to: { x: 0, y: 1 } },
    notches: [],
    marks: drawn.finishedMarks(),
    darts: drawn.darts,
    lines: drawn.lines,
    cut: drawn.cuttings,
  }
}

/** Notches at the same place of an edge are one notch; the one with more ticks stays. */
function withoutRepeats(notches: readonly Notch[]): Notch[] {
  const kept: Notch[] = []
  for (const notch of notches) {
    const same = kept.findIndex((one) => one.edge === notch.edge && Math.abs(one.at - notch.at) < 0.01)
    if (same < 0) kept.push(notch)
    else if ((kept[same] as Notch).ticks < notch.ticks) kept[same] = notch
  }
  return kept
}

/** Everything drawn, as finished pieces with notches and measured seams. */
export function finish(pen: Pen): { pieces: Piece[]; seams: SeamCheck[] } {
  const bare = new Map(pen.pieces.map((piece) => [piece.id, finishPiece(piece, pen)]))
  const notches = new Map<string, Notch[]>(pen.pieces.map((piece) => [piece.id, [...piece.extraNotches]]))
  const seams = pen.seams.map((plan) => {
    const seam = checkSeam(plan, bare, pen)
    for (const { piece, notch } of notchesOf(seam, plan.ticks ?? 1, bare)) notches.get(piece)?.push(notch)
    return seam
  })
  const pieces = [...bare.values()].map((piece) => ({
    ...piece,
    notches: withoutRepeats(notches.get(piece.id) ?? []),
  }))
  return { pieces, seams }
}

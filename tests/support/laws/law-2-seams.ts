import type { Draft, DraftOrder, Edge, Piece, Run, SeamCheck } from '@/drafting/contract'
import { lengthOfPath } from './curves'
import { garmentOf, numberOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** Half a millimetre, or half a mark of the tape. */
export function seamTolerance(order: DraftOrder): number {
  return Math.max(0.5, (order.tape ?? 0) / 2)
}

/** What is sewn is sewn once and over its whole length, both sides agree, and notches fall together. */
export const seams: DraftLaw = (draft, order, engine) => {
  const found = new Findings(2)
  coverage(found, draft)
  for (const seam of draft.seams) {
    const [a, b] = [sideLength(found, draft, seam, seam.a), sideLength(found, draft, seam, seam.b)]
    if (a === undefined || b === undefined) continue
    found.atMost(seam.id, 'difference as measured', Math.abs(a - b - seam.ease), seamTolerance(order))
    found.atMost(
      seam.id,
      'difference as stated against measured',
      Math.abs(a - b - seam.ease - seam.difference),
      0.01,
    )
    const ease = seam.easeFrom
      ? numberOf(seam.easeFrom, order, garmentOf(order, engine.garments), draft.used)
      : 0
    // Corrections move what a rule of the drawing follows from; the rule itself must still be stated.
    const follows =
      (order.corrections?.length ?? 0) > 0 &&
      garmentOf(order, engine.garments).rules.some((rule) => rule.id === seam.easeFrom)
    if (ease === undefined && !follows)
      found.add(seam.id, `its ease comes from “${seam.easeFrom}”, which nothing states`)
    else if (ease !== undefined)
      found.atMost(seam.id, 'ease against what it comes from', Math.abs(seam.ease - ease), 1e-6)
    stretches(found, seam, a, b, seamTolerance(order))
    notches(found, draft, seam)
  }
  return found.all
}

function pieceOf(draft: Draft, id: string): Piece | undefined {
  return draft.pieces.find((one) => one.id === id)
}

function edgeOf(draft: Draft, run: Run): Edge | undefined {
  return pieceOf(draft, run.piece)?.edges.find((one) => one.id === run.edge)
}

function sideLength(
  found: Findings,
  draft: Draft,
  seam: SeamCheck,
  runs: readonly Run[],
): number | undefined {
  let sum = 0
  for (const run of runs) {
    const edge = edgeOf(draft, run)
    if (!edge) {
      found.add(seam.id, `names ${run.piece}.${run.edge}, which is not drawn`)
      return undefined
    }
    sum += stretchOf(run, edge).reduce((from, to) => to - from)
  }
  return sum
}

function stretchOf(run: Run, edge: Edge): [from: number, to: number] {
  return [run.from ?? 0, run.to ?? lengthOfPath(edge.path)]
}

function coverage(found: Findings, draft: Draft): void {
  const runs = draft.seams.flatMap((seam) => [...seam.a, ...seam.b])
  for (const piece of draft.pieces) {
    for (const edge of piece.edges) {
      const own = runs.filter((run) => run.piece === piece.id && run.edge === edge.id)
      const where = `${piece.id}.${edge.id}`
      if (edge.finish !== 'seam') {
        if (own.length > 0 && edge.finish !== 'bound')
          found.add(where, `is sewn, but is finished as “${edge.finish}”`)
        continue
      }
      // The other side of a pair follows by symmetry unless a seam names it.
      const copies = own.some((run) => run.mirrored) ? [false, true] : [false]
      for (const mirrored of copies) {
        const stretches = own
          .filter((run) => (run.mirrored ?? false) === mirrored)
          .map((run) => stretchOf(run, edge))
          .sort(([a], [b]) => a - b)
        const copy = mirrored ? `${where}, mirrored` : where
        const whole = lengthOfPath(edge.path)
        let reached = 0
        for (const [from, to] of stretches) {
          if (!(to > from)) found.add(copy, 'a run goes backwards or has no length')
          if (Math.abs(from - reached) > 0.01) {
            found.add(
              copy,
              from > reached
                ? `is not sewn from ${reached.toFixed(2)} to ${from.toFixed(2)}`
                : `is sewn twice from ${from.toFixed(2)}`,
            )
          }
          reached = to
        }
        if (Math.abs(reached - whole) > 0.01) {
          found.add(copy, `is sewn as far as ${reached.toFixed(2)} of ${whole.toFixed(2)} mm`)
        }
      }
    }
  }
}

/** Every stretch between two matches takes its own share of the ease, and none where the cloth must lie flat. */
function stretches(found: Findings, seam: SeamCheck, a: number, b: number, tolerance: number): void {
  const matches = [...seam.matches]
  const [first, last] = [matches[0], matches[matches.length - 1]]
  if (!first || !last || first.a !== 0 || first.b !== 0)
    return found.add(seam.id, 'its ends do not fall together')
  found.atMost(
    seam.id,
    'its ends do not fall together',
    Math.max(Math.abs(last.a - a), Math.abs(last.b - b)),
    0.01,
  )
  for (const [index, match] of matches.entries()) {
    const before = matches[index - 1]
    if (!before) continue
    const long = match.a - before.a
    const other = match.b - before.b
    const where = `${seam.id}, stretch ${index}`
    if (!(long > 0 && other > 0)) {
      found.add(where, 'has no length')
      continue
    }
    const eased = long - other
    // Set in: flat below the notch and about the crown, all ease between.
    const head = seam.join === 'eased' && matches.length === 4
    const [least, most] = head
      ? index === 2
        ? [seam.ease, seam.ease]
        : [0, 0]
      : [Math.min(0, seam.ease), Math.max(0, seam.ease)]
    found.atMost(where, 'ease beyond what is meant', Math.max(least - eased, eased - most), tolerance)
  }
}

/** Each match inside an edge has its notch on both sides, at the same distance along the seam. */
function notches(found: Findings, draft: Draft, seam: SeamCheck): void {
  for (const side of ['a', 'b'] as const) {
    for (const match of seam.matches) {
      let rest = match[side]
      for (const [index, run] of seam[side].entries()) {
        const edge = edgeOf(draft, run)
        if (!edge) return
        const [from, to] = stretchOf(run, edge)
        if (rest > to - from + 0.01 && index < seam[side].length - 1) {
          rest -= to - from
          continue
        }
        const at = run.reversed ? to - rest : from + rest
        const whole = lengthOfPath(edge.path)
        const atCorner = at < 0.6 || at > whole - 0.6
        const marked = pieceOf(draft, run.piece)?.notches.some(
          (notch) => notch.edge === run.edge && Math.abs(notch.at - at) <= 0.5,
        )
        if (!atCorner && !marked)
          found.add(seam.id, `${run.piece}.${run.edge} has no notch at ${at.toFixed(1)} mm`)
        break
      }
    }
  }
}

import type { Draft, DraftOrder, Edge } from '@/drafting/contract'
import { endOfPath, far, lengthOfPath } from './curves'
import { garmentOf, numberOf, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** A set-in head is its armhole and its ease, front and back; the arm has room; each cut is spread by what was asked. */
export const sleeves: DraftLaw = (draft, order, engine) => {
  const found = new Findings(7)
  const garment = garmentOf(order, engine.garments)
  if (!garment.design.some((value) => value.id === 'sleeve')) {
    inOne(found, draft)
    return found.all
  }
  const kind = styleOf(order, garment, 'sleeve')
  const sleeve = draft.pieces.find((one) => one.id === 'sleeve')
  if (kind === 'kimono') inOne(found, draft)
  if (kind === 'none' || kind === 'kimono') {
    if (sleeve) found.add('sleeve', 'is drawn for a dress without one')
    return found.all
  }
  if (!sleeve) {
    found.add('sleeve', 'is missing')
    return found.all
  }
  const edge = (piece: string, id: string): Edge | undefined =>
    draft.pieces.find((one) => one.id === piece)?.edges.find((one) => one.id === id)
  const tolerance = Math.max(0.5, (order.tape ?? 0) / 2)
  const lengths = { head: 0, armhole: 0 }
  for (const side of ['front', 'back'] as const) {
    const head = edge('sleeve', `head-${side}`)
    // A dart may cut the armhole in two: what is sewn to the head is what counts.
    const armhole = draft.seams.find((seam) => seam.a.some((run) => run.edge === `head-${side}`))?.b
    const ease = numberOf(`${side}${kind === 'puff' ? 'Puff' : 'Head'}Ease`, order, garment, draft.used)
    if (!head || !armhole || ease === undefined) {
      found.add(`${side} of the head`, 'cannot be measured')
      continue
    }
    const drawn = lengthOfPath(head.path)
    const holes = armhole
      .map((run) => ({ run, one: edge(run.piece, run.edge) }))
      .map(({ run, one }) =>
        one?.role === 'armhole' ? (run.to ?? lengthOfPath(one.path)) - (run.from ?? 0) : NaN,
      )
    const hole = holes.reduce((sum, one) => sum + one, 0)
    lengths.head += drawn
    lengths.armhole += hole
    found.atMost(`${side} of the head`, 'off its armhole and ease', Math.abs(drawn - hole - ease), tolerance)
  }
  const total = numberOf('sleeveHeadEase', order, garment, draft.used) ?? NaN
  if (!order.rules && kind !== 'puff') {
    const off = Math.abs(lengths.head - lengths.armhole - total)
    found.atMost('head', 'off both armholes and the whole ease', off, tolerance)
  }
  const [front, back] = [edge('sleeve', 'head-front'), edge('sleeve', 'underarm-back')]
  const arm =
    (order.measurements.upperArm ?? draft.used.upperArm?.mm ?? NaN) +
    (numberOf('sleeveEase', order, garment, draft.used) ?? NaN)
  if (front && back && !order.tape) {
    const girth = far(endOfPath(front.path), endOfPath(back.path))
    found.atMost('biceps', 'tighter than the arm and its ease', arm - girth, 0.01)
  }
  const cut = { flared: 'sleeve', bell: 'bell' }[String(kind)]
  if (cut) {
    const value = (id: string): number => Number(styleOf(order, garment, id))
    const spread = value(`${cut}Spread`)
    mouths(
      found,
      draft,
      order,
      Array.from({ length: value(`${cut}Cuts`) }, () => spread),
    )
  }
  if (kind === 'bishop') {
    const [behind, before] = ['bishopBack', 'bishopFront'].map((id) => Number(styleOf(order, garment, id)))
    mouths(found, draft, order, [behind, behind, before, before] as number[])
  }
  if (kind === 'cap') coveredPart(found, draft, Number(styleOf(order, garment, 'capReach')), tolerance)
  return found.all
}

/** A sleeve in one with the body ends clear of its side, and a gusset is a square that front and back share alike. */
function inOne(found: Findings, draft: Draft): void {
  for (const id of ['front', 'back']) {
    const piece = draft.pieces.find((one) => one.id === id)
    const [low, corner] = ['wristLow', 'underarm'].map(
      (mark) => piece?.marks.find((one) => one.id === mark)?.at,
    )
    if (!piece?.edges.some((one) => one.id === 'mouth') || !low || !corner) continue
    if (low.x - corner.x < 60)
      found.add(id, `its sleeve is only ${(low.x - corner.x).toFixed(1)} mm clear of its side`)
  }
  const gusset = draft.pieces.find((one) => one.id === 'gusset')
  const sides = gusset?.edges.map((one) => lengthOfPath(one.path)) ?? []
  const [first = 0] = sides
  for (const side of sides) found.atMost('gusset', 'sides differ', Math.abs(side - first), 1e-6)
}

/** A cap ends where it was asked to, the same part of the armhole in front and behind. */
function coveredPart(found: Findings, draft: Draft, reach: number, tolerance: number): void {
  for (const side of ['front', 'back'] as const) {
    // A princess seam leaves a part of the armhole on the panel of the side.
    const holes = draft.pieces
      .filter((one) => one.id === side || one.id === `${side}-side`)
      .flatMap((piece) => piece.edges.map((edge) => ({ ...edge, piece: piece.id })))
      .filter((one) => one.role === 'armhole')
    const whole = holes.reduce((sum, one) => sum + lengthOfPath(one.path), 0)
    const sewn = draft.seams
      .filter((seam) => seam.a.some((run) => run.edge === `head-${side}`))
      .flatMap((seam) => seam.b)
      .reduce((sum, run) => {
        const hole = holes.find((one) => one.id === run.edge && one.piece === run.piece)
        return sum + (hole ? (run.to ?? lengthOfPath(hole.path)) - (run.from ?? 0) : NaN)
      }, 0)
    found.atMost(`${side} of the cap`, 'off the part asked', Math.abs(sewn - reach * whole), tolerance)
  }
}

/** @param spreads asked for each cut, from the back, mm. */
function mouths(found: Findings, draft: Draft, order: DraftOrder, spreads: readonly number[]): void {
  const marks = draft.pieces.find((one) => one.id === 'sleeve')?.marks ?? []
  const cuts = spreads.length
  for (const [index, spread] of spreads.entries()) {
    const cut = index + 1
    const asked = order.tape ? Math.round(spread / order.tape) * order.tape : spread
    const left = marks.find((mark) => mark.id === `cut${cut}Left`)
    const right = marks.find((mark) => mark.id === `cut${cut}Right`)
    if (!left || !right) found.add(`cut ${cut}`, 'has no mouth')
    else found.atMost(`cut ${cut}`, 'mouth off what was asked', Math.abs(far(left.at, right.at) - asked), 0.1)
  }
  if (marks.some((mark) => mark.id === `cut${cuts + 1}Left`))
    found.add('sleeve', 'has more cuts than were asked')
}

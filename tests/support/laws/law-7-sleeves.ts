import type { Draft, DraftOrder, Edge } from '@/drafting/contract'
import { endOfPath, far, lengthOfPath } from './curves'
import { garmentOf, numberOf, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** A set-in head is its armhole and its ease, front and back; the arm has room; each cut is spread by what was asked. */
export const sleeves: DraftLaw = (draft, order, engine) => {
  const found = new Findings(7)
  const garment = garmentOf(order, engine.garments)
  if (!garment.design.some((value) => value.id === 'sleeve')) return found.all
  const kind = styleOf(order, garment, 'sleeve')
  const sleeve = draft.pieces.find((one) => one.id === 'sleeve')
  if (kind === 'none') {
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
      .map((run) => edge(run.piece, run.edge))
      .map((one) => (one?.role === 'armhole' ? lengthOfPath(one.path) : NaN))
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
    mouths(found, draft, order, value(`${cut}Cuts`), value(`${cut}Spread`))
  }
  return found.all
}

function mouths(found: Findings, draft: Draft, order: DraftOrder, cuts: number, spread: number): void {
  const marks = draft.pieces.find((one) => one.id === 'sleeve')?.marks ?? []
  const asked = order.tape ? Math.round(spread / order.tape) * order.tape : spread
  for (let cut = 1; cut <= cuts; cut += 1) {
    const left = marks.find((mark) => mark.id === `cut${cut}Left`)
    const right = marks.find((mark) => mark.id === `cut${cut}Right`)
    if (!left || !right) found.add(`cut ${cut}`, 'has no mouth')
    else found.atMost(`cut ${cut}`, 'mouth off what was asked', Math.abs(far(left.at, right.at) - asked), 0.1)
  }
  if (marks.some((mark) => mark.id === `cut${cuts + 1}Left`))
    found.add('sleeve', 'has more cuts than were asked')
}

import type { Draft } from '@/drafting/contract'
import { lengthOfPath } from './curves'
import { garmentOf, numberOf, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** A close neck fits the neck, what is pulled on goes over the head, and the arm has room in its armhole. */
export const openings: DraftLaw = (draft, order, engine) => {
  const found = new Findings(17)
  const garment = garmentOf(order, engine.garments)
  if (!garment.design.some((value) => value.id === 'backOpening')) return found.all
  const style = (id: string): number | string | boolean => styleOf(order, garment, id)
  const body = (id: string): number => order.measurements[id] ?? draft.used[id]?.mm ?? NaN
  const neck = 2 * edges(draft, 'neckline')
  const close =
    style('neckShape') === 'round' &&
    ['neckWidening', 'frontNeckDrop', 'backNeckDrop'].every((id) => style(id) === 0) &&
    !order.rules &&
    !order.corrections?.some((one) => !one.off)
  const slopes = ['shoulderSlope', 'frontSlope', 'backSlope', 'overarmSlope']
  const asUsual = slopes.every((id) => {
    const slope = garment.design.find((value) => value.id === id)
    return !slope || style(id) === slope.default
  })
  if (close && asUsual && !order.tape) {
    const more = neck - body('neckBase')
    if (!(more >= 3 && more <= 12))
      found.add('neck', `is ${more.toFixed(1)} mm more than the neck; 3 to 12 are due`)
  }
  const overTheHead = [...garment.needs, ...garment.estimates].includes('head')
  const opens = style('backOpening')
  if (opens === 'zip' || opens === 'button band') {
    const half = opens === 'zip' ? 'back' : 'front'
    if (!draft.pieces.some((piece) => piece.id === half && piece.edges.some((one) => one.role === 'opening')))
      found.add(half, `is to be closed with a ${opens} and has no opening`)
  } else if (overTheHead) {
    const slits = draft.pieces
      .filter((piece) => piece.id === 'front' || piece.id === 'back')
      .flatMap((piece) => piece.lines)
      .filter((one) => one.id === 'slit' || one.id === 'keyhole')
    const opening = neck + slits.reduce((sum, one) => sum + 2 * lengthOfPath(one.path), 0)
    found.atMost('neck', 'does not go over the head by', body('head') + 20 - opening, 1e-6)
    stands(found, draft, body('head') + 20)
  }
  if (opens === 'button band') buttoned(found, draft, style('buttonSize') as number)
  // A sleeve in one with the body has no armhole.
  if (!garment.design.some((value) => value.id === 'sleeve') || style('sleeve') === 'kimono') return found.all
  const armhole = edges(draft, 'armhole')
  const ease = style('sleeve') === 'none' ? 0 : (numberOf('sleeveEase', order, garment, draft.used) ?? NaN)
  found.atMost('armhole', 'tighter than the arm and its ease by', body('upperArm') + ease - armhole, 1e-6)
  return found.all
}

const bodies = new Set(['front', 'front-side', 'back', 'back-side'])

/** Length of all edges of one role on front and back; a dart or a princess seam may part them in two. */
function edges(draft: Draft, role: 'neckline' | 'armhole'): number {
  return draft.pieces
    .filter((piece) => bodies.has(piece.id))
    .flatMap((piece) => piece.edges)
    .filter((one) => one.role === role)
    .reduce((sum, one) => sum + lengthOfPath(one.path), 0)
}

/** A stand or funnel that is closed all round goes over the head with its top edge too. */
function stands(found: Findings, draft: Draft, head: number): void {
  for (const piece of draft.pieces) {
    const top = piece.edges.find((one) => one.id === 'top')
    const closed = piece.edges.some((one) => one.id === 'centre-back' && one.role === 'seam')
    if (!['collar', 'collar-stand', 'funnel'].includes(piece.id) || !top || !closed) continue
    found.atMost(piece.id, 'does not go over the head by', head - 2 * lengthOfPath(top.path), 1e-6)
  }
}

/** Buttons stand on the centre front, clear of each other, and the front laps over by enough to carry them. */
function buttoned(found: Findings, draft: Draft, size: number): void {
  const front = draft.pieces.find((piece) => piece.id === 'front')
  const buttons = front?.marks.filter((mark) => mark.kind === 'button') ?? []
  const levels = buttons.map((mark) => mark.at.y)
  if (buttons.length < 2) found.add('front', `has ${buttons.length} buttons`)
  if (draft.notions.find((one) => one.kind === 'button')?.count !== buttons.length)
    found.add('front', 'does not say how many buttons it takes')
  for (const { at, id } of buttons) found.atMost(id, 'off the centre front', Math.abs(at.x), 1e-6)
  levels.slice(1).forEach((y, index) => {
    if (!(y - (levels[index] as number) > size)) found.add('front', 'has buttons that lie on each other')
  })
  const top = front?.marks.find((mark) => mark.id === 'centreNeck')?.at.y ?? NaN
  if (!((levels[0] as number) - size / 2 > top)) found.add('front', 'has its first button in the neckline')
  const edge = Math.min(
    ...(front?.edges.find((one) => one.id === 'opening')?.path.segments ?? []).map((one) => -one.to.x),
  )
  if (!(edge >= size / 2 + 5 - 1e-6)) found.add('front', `laps over by ${edge.toFixed(1)} mm only`)
  const bust = draft.used.bustHeight?.mm
  const spoken = draft.cautions.some((one) => one.code === 'no-button-at-bust')
  if (bust !== undefined && !spoken && !levels.some((y) => Math.abs(y - bust) < 0.01))
    found.add('front', 'has no button at the bust')
}

import type { Draft } from '@/drafting/contract'
import { lengthOfPath } from './curves'
import { garmentOf, numberOf, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** A close neck fits the neck, what is pulled on goes over the head, and the arm has room in its armhole. */
export const openings: DraftLaw = (draft, order, engine) => {
  const found = new Findings(17)
  if (order.garment !== 'flared-dress') return found.all
  const garment = garmentOf(order, engine.garments)
  const style = (id: string): number | string | boolean => styleOf(order, garment, id)
  const body = (id: string): number => order.measurements[id] ?? draft.used[id]?.mm ?? NaN
  const neck = 2 * (edge(draft, 'front', 'neckline') + edge(draft, 'back', 'neckline'))
  const close =
    style('neckShape') === 'round' &&
    ['neckWidening', 'frontNeckDrop', 'backNeckDrop'].every((id) => style(id) === 0) &&
    !order.rules &&
    !order.corrections?.some((one) => !one.off)
  if (close && style('shoulderSlope') === 38.1 && !order.tape) {
    const more = neck - body('neckBase')
    if (!(more >= 3 && more <= 12))
      found.add('neck', `is ${more.toFixed(1)} mm more than the neck; 3 to 12 are due`)
  }
  if (style('backOpening') === 'none') {
    const slit = draft.pieces.find((one) => one.id === 'back')?.lines.find((one) => one.id === 'slit')
    const opening = neck + (slit ? 2 * lengthOfPath(slit.path) : 0)
    found.atMost('neck', 'does not go over the head by', body('head') + 20 - opening, 1e-6)
  } else if (
    !draft.pieces.some((piece) => piece.id === 'back' && piece.edges.some((one) => one.role === 'opening'))
  ) {
    found.add('back', 'is to be closed with a zip and has no opening')
  }
  const armhole = edge(draft, 'front', 'armhole') + edge(draft, 'back', 'armhole')
  const ease = style('sleeve') === 'none' ? 0 : (numberOf('sleeveEase', order, garment, draft.used) ?? NaN)
  found.atMost('armhole', 'tighter than the arm and its ease by', body('upperArm') + ease - armhole, 1e-6)
  return found.all
}

function edge(draft: Draft, piece: string, id: string): number {
  const found = draft.pieces.find((one) => one.id === piece)?.edges.find((one) => one.id === id)
  return found ? lengthOfPath(found.path) : NaN
}

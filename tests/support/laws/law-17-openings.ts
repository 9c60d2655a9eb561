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
  const slopes = ['shoulderSlope', 'frontSlope', 'backSlope']
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
  if (style('backOpening') === 'none' && overTheHead) {
    const slit = draft.pieces.find((one) => one.id === 'back')?.lines.find((one) => one.id === 'slit')
    const opening = neck + (slit ? 2 * lengthOfPath(slit.path) : 0)
    found.atMost('neck', 'does not go over the head by', body('head') + 20 - opening, 1e-6)
  } else if (
    style('backOpening') !== 'none' &&
    !draft.pieces.some((piece) => piece.id === 'back' && piece.edges.some((one) => one.role === 'opening'))
  ) {
    found.add('back', 'is to be closed with a zip and has no opening')
  }
  const armhole = edges(draft, 'armhole')
  const ease = style('sleeve') === 'none' ? 0 : (numberOf('sleeveEase', order, garment, draft.used) ?? NaN)
  found.atMost('armhole', 'tighter than the arm and its ease by', body('upperArm') + ease - armhole, 1e-6)
  return found.all
}

/** Length of all edges of one role on front and back; a dart may part them in two. */
function edges(draft: Draft, role: 'neckline' | 'armhole'): number {
  return draft.pieces
    .filter((piece) => piece.id === 'front' || piece.id === 'back')
    .flatMap((piece) => piece.edges)
    .filter((one) => one.role === role)
    .reduce((sum, one) => sum + lengthOfPath(one.path), 0)
}

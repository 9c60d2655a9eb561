import { startTangent, endOf, endTangent, startOf, applyTo } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { bustDarts } from '../bodice/bust-darts'
import type { Lean } from '../bodice/half'
import { openUpper, type PlacedEdge } from '../bodice/open-darts'
import { openFront, swungOutline } from '../bodice/open-front'
import { drawHalf, type DrawnHalf } from '../bodice/panels'
import type { Faced } from '../facing'
import { takeIn } from '../take-in'
import { copyLowerMarks, shiftHem, shiftSide, sideFixed, waistDart } from './lower'

/** A half of a shift dress whose centre is still to be drawn. */
export interface ShiftHalf extends DrawnHalf {
  readonly piece: PiecePen
  readonly faced: Faced
  readonly uses: Mask
}

/**
 * Draws the front of a shift dress down to its hem, with a bust dart; its centre is the opening's to draw.
 *
 * @param front with the marks of `bodiceFrontMarks`.
 * @param back drawn before; levels of corrections are counted on it.
 */
export function drawShiftFront(pen: Pen, front: PiecePen, back: PiecePen, lean: Lean): ShiftHalf {
  copyLowerMarks(front, back)
  const origin = back.at('waistLevel').y - front.at('waistLevel').y
  const plan = pen.follow(() => ({
    side: shiftSide(pen, front, front.at('underarmClosed')),
    darts: bustDarts(pen, false),
  }))
  const opened = openFront(pen, front, {
    side: plan.made.side,
    uses: plan.uses,
    darts: plan.made.darts,
    waistPoint: front.at('bustPoint'),
    lean,
    fixed: sideFixed,
  })
  const drawn = pen.follow(() => {
    const side = takeIn(pen, front, plan.made.side, { seams: ['side'], ends: 'stay', origin }).path
    const upper = swungOutline(pen, front, side, opened.frames, lean)
    return { upper, hem: shiftHem(endOf(side), endTangent(side), front.at('lengthMark')) }
  })
  const { upper, hem } = drawn.made
  const uses = plan.uses | opened.uses | drawn.uses
  front.place('sideHem', applyTo(opened.frames.outer, startOf(hem)), {
    say: 'Mark the hem on the side, a little higher than at the centre',
    mask: uses,
    fixed: sideFixed,
  })
  const edges: readonly PlacedEdge[] = [
    ...openUpper(upper, opened.frames),
    { id: 'hem', of: 'hem', path: hem, from: 'sideHem' },
  ]
  const half = drawHalf(pen, front, edges, { uses, waist: 'seam', end: 'lengthMark' })
  const bust = front.at('bustPoint')
  const top = bust.y + pen.length('waistTip')
  waistDart(pen, front, 'front', {
    axis: bust.x,
    top,
    uses: front.usesOf('bustPoint') | pen.usesOf(['waistTip']),
  })
  const [neckline, , armhole, down] = upper
  const faced = {
    piece: front,
    neckline: neckline.path,
    armhole: armhole.path,
    side: startTangent(down.path),
    uses,
  }
  return { ...half, piece: front, faced, uses }
}

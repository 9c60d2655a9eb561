import { endOf, endTangent, startOf, startTangent, unit } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import { checkBackRoom } from '../bodice/back'
import type { Lean } from '../bodice/half'
import type { PlacedEdge } from '../bodice/open-darts'
import { drawHalf } from '../bodice/panels'
import { backNeckline, leaning } from '../necklines'
import { takeIn } from '../take-in'
import type { ShiftHalf } from './front'
import { lowerMarks, shiftHem, shiftSide, waistDart } from './lower'

/** Draws the back of a shift dress down to its hem; its centre is straight, and the opening's to draw. */
export function drawShiftBack(pen: Pen, back: PiecePen, lean: Lean): ShiftHalf {
  lowerMarks(pen, back)
  back.place(
    'halfDepth',
    { x: 0, y: (back.at('shoulderTip').y + back.at('underarm').y) / 2 },
    { say: 'Half way down the armhole', through: ['shoulderTip', 'underarm'] },
  )
  back.go('hollow', 'halfDepth', 'right', 'backHalf', {
    say: 'Go across half the back: the hollow of the armhole',
  })
  checkBackRoom(pen, back)
  const drawn = pen.follow(() => {
    pen.heed(lean.uses)
    const [neck, tip] = [back.at('sideNeck'), back.at('shoulderTip')]
    const straightSide = shiftSide(pen, back, back.at('underarm'))
    const side = takeIn(pen, back, straightSide, { seams: ['side'], ends: 'stay' }).path
    const shoulder = unit(between(neck, tip))
    return {
      side,
      neckline: backNeckline(back.at('centreNeck'), neck, leaning(lean.degrees)),
      shoulder: straight(neck, tip),
      armhole: armholeCurve(tip, back.at('hollow'), startOf(side), shoulder, startTangent(side)),
      hem: shiftHem(endOf(side), endTangent(side), back.at('lengthMark')),
    }
  })
  const { side, neckline, shoulder, armhole, hem } = drawn.made
  const { uses } = drawn
  const edges: readonly PlacedEdge[] = [
    { id: 'neckline', of: 'neckline', path: neckline, from: 'centreNeck' },
    { id: 'shoulder', of: 'shoulder', path: shoulder, from: 'sideNeck' },
    { id: 'armhole', of: 'armhole', path: armhole, from: 'shoulderTip' },
    { id: 'side', of: 'side', path: side, from: 'underarm' },
    { id: 'hem', of: 'hem', path: hem, from: 'sideHem' },
  ]
  const half = drawHalf(pen, back, edges, { uses, waist: 'seam', end: 'lengthMark' })
  waistDart(pen, back, 'back', {
    axis: back.at('underarm').x * 0.44,
    top: back.at('underarm').y + 10,
    uses: back.usesOf('underarm'),
  })
  const faced = { piece: back, neckline, armhole, side: startTangent(side), uses }
  return { ...half, piece: back, faced, uses }
}

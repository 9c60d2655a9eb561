import { distance } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { deepenFitted } from '../armhole-room'
import { faceNeckAndArmholes } from '../facings'
import { neckLeans } from '../neck-lean'
import { sleeveInto } from '../sleeves'
import { drawBodiceBack } from './back'
import { bodiceBackMarks } from './back-marks'
import { drawBodiceFront } from './front'
import { bodiceFrontMarks } from './front-marks'
import { armholeOf, type BodiceHalf } from './half'

export { fitBodice } from './fit'

/** How a bodice ends at the waist, and how its centre back opens. */
export interface BodiceWay {
  /** `seam` where a skirt is sewn on, `bound` where the waist is finished by itself. */
  readonly waist: 'bound' | 'seam'
  /** `own`: the bodice has a zip of its own. `runs on`: the whole centre back opens, and the zip runs on below the waist. */
  readonly zip: 'own' | 'runs on'
  /** A front that laps over and buttons has no zip behind. */
  readonly buttons?: boolean
}

/** A drawn bodice: each half with its pieces, where its edges are, and its waist from the centre to the side. */
export interface Bodice {
  readonly front: BodiceHalf
  readonly back: BodiceHalf
}

/**
 * Draws a fitted bodice, front on the fold and back with a centre seam, and sews shoulders, sides, darts and centre back.
 * The garment states `dartDesign`, `upperBodiceDesign`, `bodiceEaseDesign` and `bodiceAllowances`, `upperBodiceRules` and
 * `bodiceWaistRules`, `bodiceFound` and a `zipLength`.
 */
export function drawBodice(pen: Pen, way: BodiceWay): Bodice {
  deepenFitted(pen)
  const front = pen.piece('front', 'Front')
  const back = pen.piece('back', 'Back')
  bodiceFrontMarks(pen, front)
  bodiceBackMarks(pen, back, distance(front.at('sideNeck'), front.at('shoulderTip')))
  const leans = pen.follow(() => neckLeans(pen, front, back))
  const leaning = (half: 'front' | 'back') => ({ degrees: leans.made[half], uses: leans.uses })
  const ofBack = drawBodiceBack(pen, back, leaning('back'), way)
  const ofFront = drawBodiceFront(pen, front, ofBack.side, leaning('front'), way)
  const bodice = { front: ofFront, back: ofBack }
  sewBodice(pen, bodice)
  return bodice
}

function sewBodice(pen: Pen, { front, back }: Bodice): void {
  pen.sew({
    id: 'shoulder',
    name: 'Shoulder',
    a: back.runs('shoulder'),
    b: front.runs('shoulder'),
    join: 'eased',
    easeFrom: 'shoulderEase',
    smooth: true,
  })
  pen.sew({ id: 'side', name: 'Side seam', a: back.runs('side'), b: front.runs('side'), smooth: true })
}

/** Sets the sleeves of the style into a bodice, or none, and faces what stays open. */
export function finishBodice(pen: Pen, { front, back }: Bodice): void {
  const { bare } = sleeveInto(pen, armholeOf(front), armholeOf(back))
  faceNeckAndArmholes(pen, [front.faced, front.centre], [back.faced, back.centre], bare, {
    runs: (piece, edge) => (piece === 'front' ? front : back).runs(edge),
    shoulderEase: 'shoulderEase',
  })
}

import type { Run } from '../../contract'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { deepenFitted } from '../armhole-room'
import type { Faced } from '../facing'
import { faceNeckAndArmholes } from '../facings'
import { neckLeans } from '../neck-lean'
import type { Centres } from '../openings/opening'
import { sleeveInto } from '../sleeves'
import { bodiceBackMarks, drawBodiceBack } from './back'
import { bodiceFrontMarks, drawBodiceFront } from './front'

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

/** A drawn bodice and where its edges are: darts divide them. */
export interface Bodice {
  readonly front: PiecePen
  readonly back: PiecePen
  /** The edges that one edge of a half consists of, in order clockwise from the centre neck. */
  readonly runs: (half: 'front' | 'back', edge: string) => Run[]
  /** The waist of each half from the centre to the side, its darts left out. */
  readonly waist: { readonly front: readonly Run[]; readonly back: readonly Run[] }
  /** The halves with their darts closed, as facings are traced from them. */
  readonly faced: { readonly front: Faced; readonly back: Faced }
  readonly centres: Centres
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
  bodiceBackMarks(pen, back)
  bodiceFrontMarks(pen, front)
  const leans = neckLeans(pen, front, back)
  const ofBack = drawBodiceBack(pen, back, leans.back, way)
  const ofFront = drawBodiceFront(pen, front, back.lengthOf('side'), leans.front, way)
  for (const piece of [front, back]) {
    // Below the neckline too, where that is deep.
    const top = Math.max(piece.at('scyeLevel').y, piece.at('centreNeck').y + 15)
    piece.grain({ x: 35, y: top }, { x: 35, y: piece.at('centreWaist').y - 25 })
  }
  const onFold = !way.buttons
  front.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  back.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  const runs: Bodice['runs'] = (half, edge) =>
    half === 'front' ? ofFront.runs(edge) : [{ piece: 'back', edge }]
  sewBodice(pen, runs)
  const waistOf = (piece: PiecePen, edges: readonly string[]): Run[] =>
    edges.map((edge) => ({ piece: piece.id, edge, reversed: true })).reverse()
  return {
    front,
    back,
    runs,
    waist: { front: waistOf(front, ofFront.waist), back: waistOf(back, ofBack.waist) },
    faced: { front: ofFront.faced, back: ofBack.faced },
    centres: { front: ofFront.centre, back: { kind: way.buttons ? 'seam' : 'zip' } },
  }
}

function sewBodice(pen: Pen, runs: Bodice['runs']): void {
  pen.sew({
    id: 'shoulder',
    name: 'Shoulder',
    a: runs('back', 'shoulder'),
    b: runs('front', 'shoulder'),
    join: 'eased',
    easeFrom: 'shoulderEase',
    smooth: true,
  })
  pen.sew({ id: 'side', name: 'Side seam', a: runs('back', 'side'), b: runs('front', 'side'), smooth: true })
}

/** Sets the sleeves of the style into a bodice, or none, and faces what stays open. */
export function finishBodice(pen: Pen, bodice: Bodice): void {
  const armhole = (half: 'front' | 'back') => ({
    piece: bodice[half],
    edges: bodice.runs(half, 'armhole').map((run) => run.edge),
  })
  const { bare } = sleeveInto(pen, armhole('front'), armhole('back'))
  faceNeckAndArmholes(
    pen,
    [bodice.faced.front, bodice.centres.front],
    [bodice.faced.back, bodice.centres.back],
    bare,
    {
      runs: (piece, edge) => bodice.runs(piece === 'front' ? 'front' : 'back', edge),
      shoulderEase: 'shoulderEase',
    },
  )
}

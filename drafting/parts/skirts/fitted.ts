import type { Point } from '../../contract'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import type { WalkingRoom } from './centre'
import { fitHem, fitHip, fitWaistOf } from './fits'
import { drawSkirtHalf } from './half'
import { skirtMarks, type SkirtHalf } from './marks'
import { bandOnSkirt, sewSkirtSides, wholeWaist } from './seams'
import { skirtPiece, type DrawnSkirt, type SkirtUse } from './skirt'
import { fitSkirtWaist } from './waist'

/** What tells one fitted skirt from another. */
interface Manner {
  /** Degrees of the first darts that are closed into the hem. */
  readonly close: (halves: readonly [SkirtHalf, SkirtHalf]) => number
  /** Where the side ends, before it is turned. */
  readonly hem: (front: PiecePen) => Point
  readonly walking: WalkingRoom
  /** What the side follows from beside the rules of the block. */
  readonly uses: readonly string[]
}

/** Draws a skirt that is fitted with darts between waist and hip: front on the fold, back on the fold or with a seam. */
export function drawFitted(pen: Pen, use: SkirtUse, { close, hem, walking, uses }: Manner): DrawnSkirt {
  const [front, back] = [skirtPiece(pen, use, 'front', 'Front'), skirtPiece(pen, use, 'back', 'Back')]
  const marked = [skirtMarks(pen, front, 'front'), skirtMarks(pen, back, 'back')] as const
  const { sewnTo } = use
  const [ofFront, ofBack] = fitSkirtWaist(pen, marked, {
    close: close(marked),
    hip: front.at('hip'),
    hem: hem(front),
    wanted: sewnTo ? [sewnTo.front.length, sewnTo.back.length] : pen.value('waistQuarter') * 2,
  })
  const halves = [
    drawSkirtHalf(pen, ofFront, use, walking, uses),
    drawSkirtHalf(pen, ofBack, use, walking, uses),
  ] as const
  sewSkirtSides(pen, front, back, use)
  fitWaistOf(pen, halves, use)
  fitHip(pen, halves, 'hipEase')
  fitHem(pen, halves)
  bandOnSkirt(pen, ...halves, use)
  return wholeWaist(...halves)
}

import type { Point } from '../../contract'
import type { Pen } from '../../pen/pen'
import { patchPocket } from '../pockets/patch'
import type { WalkingRoom } from './centre'
import { fitHem, fitHip, fitWaistOf } from './fits'
import { drawSkirtHalf } from './half'
import { meetDarts } from './below-darts'
import { skirtMarks } from './marks'
import { bandOnSkirt, sewSkirtSides, wholeWaist } from './seams'
import { skirtPiece, type DrawnSkirt, type SkirtUse } from './skirt'
import { fitSkirtWaist } from './waist'

/** What tells one fitted skirt from another. */
interface Manner {
  /** Degrees of the first darts that are closed into the hem. */
  readonly close: number
  /** Where the side ends, before it is turned. */
  readonly hem: (hip: Point) => Point
  readonly walking: WalkingRoom
  /** What the side follows from beside the rules of the block. */
  readonly uses: readonly string[]
}

/** Draws a skirt that is fitted with darts between waist and hip: front on the fold, back on the fold or with a seam. */
export function drawFitted(pen: Pen, use: SkirtUse, { close, hem, walking, uses }: Manner): DrawnSkirt {
  const { sewnTo } = use
  if (sewnTo) {
    meetDarts(pen, sewnTo, () => {
      const hip = { x: pen.lengthRounded('skirtQuarter', 'up'), y: pen.length('hipLine') }
      return { close, hip, hem: hem(hip) }
    })
  }
  const [front, back] = [skirtPiece(pen, use, 'front', 'Front'), skirtPiece(pen, use, 'back', 'Back')]
  const by = sewnTo ? (['DartBelow', 'DartNext'] as const) : (['DartOut', 'DartBetween'] as const)
  const marked = [skirtMarks(pen, front, 'front', by), skirtMarks(pen, back, 'back', by)] as const
  const [ofFront, ofBack] = fitSkirtWaist(pen, marked, {
    close,
    hip: front.at('hip'),
    hem: hem(front.at('hip')),
    wanted: sewnTo ? [sewnTo.front.length, sewnTo.back.length] : pen.value('waistQuarter') * 2,
  })
  const halves = [
    drawSkirtHalf(pen, ofFront, use, walking, uses),
    drawSkirtHalf(pen, ofBack, use, walking, uses),
  ] as const
  sewSkirtSides(pen, front, back, use)
  patchPocket(pen, front, front.byRule('centreWaist'))
  fitWaistOf(pen, halves, use)
  fitHip(pen, halves, 'hipEase')
  fitHem(pen, halves)
  bandOnSkirt(pen, ...halves, use)
  return wholeWaist(...halves)
}

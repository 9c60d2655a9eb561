import { garment } from '../pen/garment'
import { length } from '../pen/design'
import { pocketDesign } from '../parts/in-seam-pocket'
import { skirtBlockDesign, skirtBlockRules } from '../parts/skirt-block'
import { walkingDesign, walkingRules, type WalkingRoom } from '../parts/skirt-centre'
import { fitHem, fitHip, fitWaistOf } from '../parts/skirt-fits'
import { drawSkirtHalf } from '../parts/skirt-half'
import { skirtMarks } from '../parts/skirt-marks'
import { bandOnSkirt, sewSkirtSides } from '../parts/skirt-seams'
import { fitSkirtWaist } from '../parts/skirt-waist'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../parts/waistband'

/** A skirt fitted over the hip and straight below it. */
export const straightSkirt = garment({
  id: 'straight-skirt',
  name: 'Straight skirt',
  needs: ['waist', 'hip'],
  estimates: ['height', 'waistToHip'],
  design: [
    ...skirtBlockDesign,
    ...walkingDesign,
    ...waistbandDesign,
    waistEasedIn,
    ...pocketDesign.map((value) => (value.id === 'pockets' ? { ...value, default: false } : value)),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 40, min: 0, max: 60 }),
  ],
  rules: [...skirtBlockRules, ...walkingRules, ...waistbandRules],
  found: { waistDrawn: 'length' },
  draft(pen) {
    const [front, back] = [pen.piece('front', 'Front'), pen.piece('back', 'Back')]
    const marked = [skirtMarks(pen, front, 'front'), skirtMarks(pen, back, 'back')]
    const hem = { x: front.at('hip').x, y: front.at('centreHem').y }
    const walking = pen.chosen('walkingRoom') as WalkingRoom
    const halves = fitSkirtWaist(pen, marked, hem).map((half) => drawSkirtHalf(pen, half, walking))
    sewSkirtSides(pen, front, back)
    fitWaistOf(pen, halves)
    fitHip(pen, halves, 'hipEase')
    fitHem(pen, halves)
    bandOnSkirt(pen, halves)
  },
})

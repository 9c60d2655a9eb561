import { garment } from '../pen/garment'
import { choice } from '../pen/design'
import type { Pen } from '../pen/pen'
import { drawBodice, finishBodice, fitBodice, type Bodice } from '../parts/bodice'
import { bodiceAllowances, bodiceEaseDesign, dartDesign, upperBodiceDesign } from '../parts/bodice/design'
import { bodiceEstimates, bodiceFound, bodiceWaistRules, upperBodiceRules } from '../parts/bodice/rules'
import { collarDesign, collarRules } from '../parts/collars'
import { dressSkirtDesign, dressSkirtFound, dressSkirtRules, skirts } from '../parts/skirts'
import type { Skirt } from '../parts/skirts/skirt'
import { allSleeves, sleeveDesign, sleeveRules } from '../parts/sleeves'
import { sewWaist, waistToMeet } from '../parts/waist-seam'

/** A fitted bodice with a skirt sewn to its waist; the zip at the centre back runs through both. */
export const waistSeamDress = garment({
  id: 'waist-seam-dress',
  name: 'Dress with a waist seam',
  needs: ['bust', 'waist', 'hip'],
  estimates: [...bodiceEstimates.filter((id) => id !== 'hip'), 'waistToHip'],
  design: [
    choice('skirt', 'Skirt', 'skirt', ['A-line', ...Object.keys(skirts).filter((name) => name !== 'A-line')]),
    ...dartDesign,
    ...upperBodiceDesign,
    ...bodiceEaseDesign,
    ...sleeveDesign('none', ...allSleeves),
    ...collarDesign,
    ...dressSkirtDesign,
    ...bodiceAllowances,
  ],
  rules: [
    ...upperBodiceRules,
    ...bodiceWaistRules,
    ...sleeveRules(...allSleeves),
    ...collarRules,
    ...dressSkirtRules,
  ],
  found: { ...bodiceFound, ...dressSkirtFound },
  draft(pen) {
    const bodice = drawBodice(pen, { waist: 'seam', zip: 'runs on' })
    fitBodice(pen, bodice)
    hangSkirt(pen, bodice)
    finishBodice(pen, bodice)
  },
})

/** Draws the skirt of the style to the waist of the bodice, and the zip that runs through both. */
function hangSkirt(pen: Pen, bodice: Bodice): void {
  const kind = String(pen.chosen('skirt'))
  const sewnTo = waistToMeet(pen, bodice)
  const [back] = bodice.back.pieces
  if (!back) throw new Error('Every bodice has a back.')
  const skirt = (skirts[kind] as Skirt).draw(pen, {
    prefix: 'skirt-',
    opening: 'centre-back zip',
    zip: 'zipBelowWaist',
    origin: back.at('waistLevel').y,
    sewnTo,
  })
  sewWaist(pen, bodice, sewnTo, skirt, kind === 'gathered')
  const zip = back.lengthOf('opening') + pen.length('zipBelowWaist')
  pen.notion({ kind: 'zip', length: zip, count: 1 })
}

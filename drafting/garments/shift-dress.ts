import { garment } from '../pen/garment'
import { choice, length } from '../pen/design'
import { bodiceAllowances, upperBodiceDesign } from '../parts/bodice/design'
import { bodiceEstimates, bodiceFound, upperBodiceRules } from '../parts/bodice/rules'
import { collarDesign, collarRules } from '../parts/collars'
import { openingDesign, openingRules } from '../parts/openings'
import { pocketDesign } from '../parts/pockets/in-seam'
import { drawShift } from '../parts/shift'
import { shiftDesign, shiftRules } from '../parts/shift/rules'
import { allSleeves, sleeveDesign, sleeveRules } from '../parts/sleeves'

const atSide = { id: 'dartTo', is: ['side'] }
const unused = new Set(['waistAllowance', 'panelAllowance'])

/** A dress in one piece from shoulder to hem with a bust dart, shaped through the waist. Rules: common practice. */
export const shiftDress = garment({
  id: 'shift-dress',
  name: 'Shift dress',
  needs: ['bust', 'waist', 'hip'],
  estimates: [...bodiceEstimates.filter((id) => id !== 'hip'), 'waistToHip', 'head'],
  design: [
    choice('dartTo', 'Bust dart to', 'darts', ['side', 'shoulder', 'armhole', 'neck']),
    length('dartBelowArmhole', 'Dart below the armhole', 'darts', { default: 60, min: 30, max: 90 }, atSide),
    length('dartShort', 'Dart short of the bust point', 'darts', { default: 25, min: 15, max: 40 }),
    ...upperBodiceDesign,
    ...shiftDesign,
    ...sleeveDesign('none', ...allSleeves),
    ...collarDesign,
    ...openingDesign(['zip', 'none', 'button band', 'keyhole', 'side zip']),
    ...pocketDesign,
    ...bodiceAllowances.filter(({ id }) => !unused.has(id)),
  ],
  rules: [...upperBodiceRules, ...shiftRules, ...sleeveRules(...allSleeves), ...collarRules, ...openingRules],
  found: { ...bodiceFound, zipDrawn: 'length' },
  draft: drawShift,
})

import { commonPractice } from '../pen/garment'
import type { Remedy } from './remedy'

/** The girth is measured, so it is shared out anew: what the front gains the back gives, and the darts grow. */
export const fullBust: Remedy = {
  id: 'full-bust',
  name: 'Full bust',
  see: 'Folds run from the bust to the side, the front rises at the waist, the armhole gapes.',
  does: 'Gives each half of the front so much more across, takes it from the back, and opens the bust dart wider. The side seam lies further back. The front waist length must be measured over the bust.',
  source: commonPractice,
  default: 10,
  min: 3,
  max: 20,
  ways: [
    {
      changes: [
        { rule: 'frontQuarter', per: 1 },
        { rule: 'backQuarter', per: -1 },
        { rule: 'bustDartAngle', per: 0.25 },
      ],
    },
    // Where there is a waist its halves go along, so that the side seam keeps its slant.
    {
      needs: ['frontQuarter', 'backQuarter', 'bustDartAngle'],
      changes: [
        { rule: 'frontWaistHalf', per: 1 },
        { rule: 'backWaistHalf', per: -1 },
      ],
    },
  ],
}

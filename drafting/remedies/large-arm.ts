import { commonPractice } from '../pen/garment'
import type { Remedy } from './remedy'

export const largeArm: Remedy = {
  id: 'large-arm',
  name: 'Large arm',
  see: 'The sleeve draws across the upper arm and rides up.',
  does: 'Makes the sleeve so much wider round the arm; its head comes down to the same armhole, and the armhole is deepened where that is too small.',
  source: commonPractice,
  default: 25,
  min: 10,
  max: 50,
  // Ease and not the measurement, so that the sums still show the arm that was measured.
  ways: [{ changes: [{ style: 'sleeveEase', per: 1 }] }],
  where: {
    style: 'sleeve',
    not: 'none',
    message: 'There is no sleeve to be made wider. Choose a sleeve, or leave the remedy out.',
  },
}

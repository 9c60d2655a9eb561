import { commonPractice } from '../pen/garment'
import { shoulderTurn, type Remedy } from './remedy'

export const forwardShoulder: Remedy = {
  id: 'forward-shoulder',
  name: 'Forward shoulder',
  see: 'The shoulder seam lies behind the top of the shoulder, and the sleeve pulls at the front of its head.',
  does: 'Turns the shoulder seam about the side neck so that its tip lies so much further forward: lower on the front, higher on the back.',
  source: commonPractice,
  default: 6,
  min: 3,
  max: 12,
  ways: [
    {
      changes: [
        { style: 'frontSlope', per: shoulderTurn },
        { style: 'backSlope', per: -shoulderTurn },
      ],
    },
  ],
}

import { commonPractice } from '../pen/garment'
import { shoulderTurn, type Remedy } from './remedy'

export const slopingShoulder: Remedy = {
  id: 'sloping-shoulder',
  name: 'Sloping shoulder',
  see: 'Folds run down from the neck to the armhole, and the armhole drops.',
  does: 'Lowers the shoulder tips by so much, front and back, and the underarm with them.',
  source: commonPractice,
  default: 8,
  min: 3,
  max: 15,
  ways: [
    {
      changes: [
        { style: 'frontSlope', per: shoulderTurn },
        { style: 'backSlope', per: shoulderTurn },
        { rule: 'scyeLine', per: 1 },
      ],
    },
    {
      changes: [
        { style: 'shoulderSlope', per: 1 },
        { rule: 'armholeDepth', per: 1 },
      ],
    },
  ],
}

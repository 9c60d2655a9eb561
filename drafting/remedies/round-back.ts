import { commonPractice } from '../pen/garment'
import { shoulderTurn, type Remedy } from './remedy'

export const roundBack: Remedy = {
  id: 'round-back',
  name: 'Round back',
  see: 'The neck stands away at the nape, folds run from the shoulder blades to the armholes, the back rides up.',
  does: 'Makes the back so much longer between the nape and the underarm, with more slope and more ease in the back shoulder.',
  source: commonPractice,
  default: 8,
  min: 3,
  max: 12,
  ways: [
    {
      changes: [
        { rule: 'scyeLine', per: 1 },
        { rule: 'shoulderEase', per: 0.4 },
        { style: 'backSlope', per: 0.5 * shoulderTurn },
      ],
    },
  ],
}

import { commonPractice } from '../pen/garment'
import type { Remedy } from './remedy'

export const swayBack: Remedy = {
  id: 'sway-back',
  name: 'Sway back',
  see: 'Folds lie across the back at the waist, above the seat.',
  does: 'Raises the back of a bodice, and lowers the top of a skirt, by so much at the centre, running out to nothing at the side.',
  source: commonPractice,
  default: 10,
  min: 3,
  max: 20,
  ways: [
    {
      needs: ['backWaistHalf', 'centreBackIn'],
      changes: [{ piece: 'back', mark: 'centreWaist', per: { x: 0, y: -1 } }],
    },
    { changes: [{ rule: 'centreBackDrop', per: 1 }] },
  ],
}

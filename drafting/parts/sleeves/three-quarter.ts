import { length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import { setIn } from './set-in'
import { smoothEase, type Sleeve } from './sleeve-kind'
import { taperBlame, taperBy } from './taper'

const worn = { id: 'sleeve', is: ['three-quarter'] }

/** A three-quarter sleeve: it ends so far below the elbow, its level marked. */
export const threeQuarter: Sleeve = {
  design: [
    length('belowElbow', 'Hem below the elbow', 'sleeve', { default: 110, min: 30, max: 180 }, worn),
    length(
      'threeQuarterTaper',
      'Taper of the three-quarter sleeve',
      'sleeve',
      { default: 25, min: 0, max: 40 },
      worn,
    ),
  ],
  rules: [lengthRule('threeQuarterSleeve', 'Three-quarter sleeve: length', 'elbowLevel + belowElbow')],
  turnedUp: true,
  draw: setIn({
    length: 'threeQuarterSleeve',
    lengthField: 'belowElbow',
    ease: smoothEase,
    join: 'eased',
    hem: 'sweep',
    blame: taperBlame('threeQuarterTaper'),
    corners: (pen, sleeve) => {
      sleeve.go('elbow', 'crown', 'down', 'elbowLevel', { say: 'Mark the level of the elbow' })
      return taperBy('threeQuarterTaper')(pen, sleeve)
    },
  }),
}

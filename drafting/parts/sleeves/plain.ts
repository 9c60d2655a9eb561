import { length } from '../../pen/design'
import { setIn } from './set-in'
import { smoothEase, type Sleeve } from './sleeve-kind'
import { taperBlame, taperBy } from './taper'

/** A plain sleeve of any length: each side comes in by the taper. */
export const plain: Sleeve = {
  design: [
    length(
      'sleeveTaper',
      'Taper of each side',
      'sleeve',
      { default: 15, min: 0, max: 40 },
      { id: 'sleeve', is: ['plain'] },
    ),
  ],
  rules: [],
  turnedUp: true,
  draw: setIn({
    length: 'sleeveLength',
    lengthField: 'sleeveLength',
    ease: smoothEase,
    join: 'eased',
    hem: 'sweep',
    blame: taperBlame('sleeveTaper'),
    corners: taperBy('sleeveTaper'),
  }),
}

import { count, length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import { fanOut } from '../slash-and-spread'
import { setIn } from './set-in'
import { smoothEase, type Sleeve } from './sleeve-kind'

const worn = { id: 'sleeve', is: ['bell'] }

/** A bell sleeve: long, cut from the hem to the head and spread until it hangs like a bell. */
export const bell: Sleeve = {
  // Common practice, no published source: four to six cuts of 3–6 cm.
  design: [
    length('bellShort', 'Shorter than the arm by', 'sleeve', { default: 30, min: 0, max: 250 }, worn),
    count('bellCuts', 'Number of cuts in the bell', 'sleeve', { default: 5, min: 4, max: 6 }, worn),
    length('bellSpread', 'Spread at each cut of the bell', 'sleeve', { default: 45, min: 30, max: 60 }, worn),
  ],
  rules: [lengthRule('bellLength', 'Bell sleeve: length', 'armLength - bellShort')],
  turnedUp: true,
  draw: setIn({
    length: 'bellLength',
    lengthField: 'bellShort',
    ease: smoothEase,
    join: 'eased',
    hem: 'bow',
    blame: {
      field: 'bellSpread',
      head: 'So much spread flattens the sleeve head until it no longer fits its armhole. Use fewer cuts or spread each less.',
      hem: 'The hem of this bell cannot be drawn in one sweep. Spread it less.',
    },
    corners: (pen, sleeve, head) =>
      fanOut(pen, sleeve, head, { cuts: 'bellCuts', spread: 'bellSpread', length: 'bellLength' }),
  }),
}

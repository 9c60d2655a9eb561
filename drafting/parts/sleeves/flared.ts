import { count, length } from '../../pen/design'
import { fanOut } from '../slash-and-spread'
import { setIn } from './set-in'
import { smoothEase, type Sleeve } from './sleeve-kind'

const worn = { id: 'sleeve', is: ['flared'] }

/** A flared sleeve: cut from the hem to the head and spread at the hem. */
export const flared: Sleeve = {
  design: [
    count('sleeveCuts', 'Number of cuts', 'sleeve', { default: 4, min: 2, max: 8 }, worn),
    length('sleeveSpread', 'Spread at each cut', 'sleeve', { default: 40, min: 5, max: 80 }, worn),
  ],
  rules: [],
  turnedUp: true,
  draw: setIn({
    length: 'sleeveLength',
    lengthField: 'sleeveLength',
    ease: smoothEase,
    join: 'eased',
    hem: 'bow',
    blame: {
      field: 'sleeveSpread',
      head: 'So much spread flattens the sleeve head until it no longer fits its armhole. Use fewer cuts or spread each less.',
      hem: 'The hem of this sleeve cannot be drawn in one sweep. Spread or taper it less.',
    },
    corners: (pen, sleeve, head) =>
      fanOut(pen, sleeve, head, { cuts: 'sleeveCuts', spread: 'sleeveSpread', length: 'sleeveLength' }),
  }),
}

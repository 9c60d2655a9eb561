import { fanOut } from '../slash-and-spread'
import { smoothEase, type SleeveKind } from './sleeve-kind'

/** A flared sleeve: cut from the hem to the head and spread at the hem. */
export const flared: SleeveKind = {
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
}

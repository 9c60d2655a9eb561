import type { Neckline } from './neckline'
import { round } from './round'

/** Keyhole: a round close neck with a drop-shaped slit below its centre, faced, and closed with a loop and a button. */
export const keyhole: Neckline = {
  depth: round.depth,
  widening: round.widening,
  lean: round.lean,
  mostLean: round.mostLean,
  draw: round.draw,
  keyhole: 'frontKeyhole',
}

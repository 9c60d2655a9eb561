import type { Pen } from '../../pen/pen'
import { boat } from './boat'
import type { Neckline } from './neckline'
import { round } from './round'
import { scoop } from './scoop'
import { square } from './square'
import { sweetheart } from './sweetheart'
import { v } from './v'

export { backNeckline } from './back'
export { leaning, neckCurve } from './neckline'

/** The necklines by their names in the style. */
const necklines: Readonly<Record<string, Neckline>> = {
  round,
  V: v,
  square,
  boat,
  scoop,
  sweetheart,
}

/** The neckline of a style. Every shape that a garment offers has one. */
export function chosenNeckline(pen: Pen): Neckline {
  const shape = necklines[String(pen.chosen('neckShape'))]
  if (!shape) throw new Error('Every neck shape offered has a neckline.')
  return shape
}

import { boat } from './boat'
import type { Neckline } from './neckline'
import { round } from './round'
import { square } from './square'
import { v } from './v'

export { backNeckline } from './back'
export { leaning, neckCurve } from './neckline'

/** The necklines by their names in the style. */
export const necklines: Readonly<Record<string, Neckline>> = { round, V: v, square, boat }

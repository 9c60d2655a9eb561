import type { DesignValue } from '../../contract'
import { choice, length } from '../../pen/design'
import type { Pen } from '../../pen/pen'
import { boat } from './boat'
import { high } from './high'
import { keyhole } from './keyhole'
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
  keyhole,
  high,
}

const is = (name: string) => ({ id: 'neckShape', is: [name] })

/** The neck shapes that a garment offers, the first its usual one, with the style values that only they have. */
export function neckDesign(...offered: readonly [string, ...string[]]): readonly DesignValue[] {
  const own = [
    length('frontKeyhole', 'Keyhole, depth', 'neckline', { default: 100, min: 60, max: 200 }, is('keyhole')),
    length('funnelHeight', 'Height of the funnel', 'neckline', { default: 55, min: 25, max: 90 }, is('high')),
    length(
      'funnelRise',
      'Funnel raised in front by',
      'neckline',
      { default: 8, min: 0, max: 20 },
      is('high'),
    ),
  ]
  return [
    choice('neckShape', 'Neck shape', 'neckline', offered),
    ...own.filter(({ when }) => when?.is.some((name) => offered.includes(String(name)))),
  ]
}

/** The neckline of a style. Every shape that a garment offers has one. */
export function chosenNeckline(pen: Pen): Neckline {
  const shape = necklines[String(pen.chosen('neckShape'))]
  if (!shape) throw new Error('Every neck shape offered has a neckline.')
  return shape
}

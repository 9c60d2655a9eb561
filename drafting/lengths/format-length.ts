import type { Unit } from '../contract'
import { badLength } from './bad-length'
import { fractionText, nearestFraction, roundHalfAway } from './fractions'
import { millimetresPer } from './units'

export interface LengthFormat {
  /** Smallest division of an inch; eighths by default. */
  readonly denominator?: 4 | 8 | 16
}

/**
 * The number of a length in its unit, without the unit's name: '36 1/2' or '92.7'.
 * @param mm finite
 * @throws DraftingError 'bad-length' when it is not
 */
export function lengthDigits(mm: number, unit: Unit, { denominator = 8 }: LengthFormat = {}): string {
  if (!Number.isFinite(mm))
    throw badLength('Only a finite number of millimetres can be written as a length.', 'length')
  if (unit === 'in') return fractionText(nearestFraction(mm / millimetresPer.in, denominator))
  const tenths = roundHalfAway(mm)
  return `${tenths < 0 ? '−' : ''}${Math.abs(tenths) / 10}`
}

/**
 * A length as it stands on a tag: to the nearest eighth of an inch ('36 1/2 in'), or to the millimetre ('92.7 cm').
 * Fractions are digits and slash; setting them as type is the writer's task. `parseLength` reads it back.
 * @param mm finite; negative is written with a minus sign
 * @throws DraftingError 'bad-length' when it is not finite
 */
export function formatLength(mm: number, unit: Unit, format: LengthFormat = {}): string {
  return `${lengthDigits(mm, unit, format)} ${unit}`
}

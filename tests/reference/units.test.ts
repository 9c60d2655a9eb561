import convert from 'convert-units'
import { expect, test } from 'vitest'
import { parseLength } from '../../drafting/lengths'

/**
 * An independent table of units, the package convert-units 2.3.4, which takes a foot as 1 ÷ 3.28084 m. The inch
 * has been 25.4 mm exactly since 1959 (international yard and pound agreement); the two agree to 4 parts in 10⁸.
 */
const nearly = 4e-8

test.each([
  ['in', 'in', [0.125, 1, 7.375, 36.5, 120]],
  ['cm', 'cm', [0.1, 1, 92.7, 300]],
  ['in', 'ft', [1, 3.5, 9]],
  ['in', 'm', [0.5, 1.75]],
  ['cm', 'mm', [1, 927]],
] as const)(
  'lengths typed in a field of %s, written in %s, agree with an independent table',
  (field, unit, values) => {
    for (const value of values) {
      const theirs = convert(value).from(unit).to('mm')
      const ours = parseLength(`${value} ${unit}`, field, 'bust')
      expect(Math.abs(ours - theirs) / theirs).toBeLessThan(nearly)
    }
  },
)

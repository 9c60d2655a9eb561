import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DraftingError } from '@/drafting/drafting-error'
import { formatLength, parseLength } from '@/drafting/lengths'

const inches = (value: number) => value * 25.4

describe('writing a length', () => {
  it.each([
    [927.1, 'in', '36 1/2 in'],
    [927, 'cm', '92.7 cm'],
    [920, 'cm', '92 cm'],
    [inches(35.9375), 'in', '36 in'],
    [inches(36.0625), 'in', '36 1/8 in'],
    [inches(0.375), 'in', '3/8 in'],
    [0, 'in', '0 in'],
    [0, 'cm', '0 cm'],
    [-12.7, 'in', '−1/2 in'],
    [-25, 'cm', '−2.5 cm'],
    [-0.2, 'cm', '0 cm'],
    [-0.5, 'in', '0 in'],
    [0.45, 'cm', '0 cm'],
  ] as const)('writes %d mm in %s as %s', (mm, unit, text) => {
    expect(formatLength(mm, unit)).toBe(text)
  })

  it('rounds to quarters and sixteenths when asked', () => {
    expect(formatLength(inches(35.9375), 'in', { denominator: 16 })).toBe('35 15/16 in')
    expect(formatLength(inches(7.375), 'in', { denominator: 4 })).toBe('7 1/2 in')
  })

  it.each([NaN, Infinity, -Infinity])('refuses %d', (mm) => {
    expect(() => formatLength(mm, 'in')).toThrow(DraftingError)
  })

  it('is read back within its rounding, and a second time to the same text', () => {
    const denominators = fc.constantFrom(4 as const, 8 as const, 16 as const)
    fc.assert(
      fc.property(
        fc.double({ min: -3000, max: 3000, noNaN: true }),
        fc.constantFrom('in' as const, 'cm' as const),
        denominators,
        (mm, unit, denominator) => {
          const text = formatLength(mm, unit, { denominator })
          const back = parseLength(text, 'cm')
          expect(Math.abs(back - mm)).toBeLessThanOrEqual(
            (unit === 'in' ? inches(0.5 / denominator) : 0.5) + 1e-6,
          )
          expect(formatLength(back, unit, { denominator })).toBe(text)
        },
      ),
    )
  })

  it('does not drift when the unit is switched a hundred times', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 480 }), (eighths) => {
        const typed = parseLength(`${Math.floor(eighths / 8)} ${eighths % 8}/8`, 'in')
        let mm = typed
        for (let turn = 0; turn < 100; turn += 1)
          mm = parseLength(formatLength(mm, turn % 2 === 0 ? 'cm' : 'in'), 'cm')
        expect(mm).toBe(typed)
      }),
    )
  })
})

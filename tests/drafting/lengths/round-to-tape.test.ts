import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DraftingError } from '@/drafting/drafting-error'
import { roundToTape } from '@/drafting/lengths'

const eighth = 3.175

describe('rounding to the tape', () => {
  it('takes the nearest mark', () => {
    expect(roundToTape(185, eighth)).toBe(58 * eighth)
    expect(roundToTape(12.4, 1)).toBe(12)
    expect(roundToTape(-12.5, 1)).toBe(-13)
    expect(Object.is(roundToTape(-0.2, 1), 0)).toBe(true)
  })

  it('never moves a length by more than half a mark, and leaves marks alone', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -3000, max: 3000, noNaN: true }),
        fc.constantFrom(1, 2.5, 5, eighth, 6.35),
        (mm, tape) => {
          const marked = roundToTape(mm, tape)
          expect(Math.abs(marked - mm)).toBeLessThanOrEqual(tape / 2 + 1e-6)
          expect(roundToTape(marked, tape)).toBe(marked)
        },
      ),
    )
  })

  it.each([0, -1, NaN, Infinity])('refuses a tape of %d mm', (tape) => {
    expect(() => roundToTape(10, tape)).toThrow(DraftingError)
  })
})

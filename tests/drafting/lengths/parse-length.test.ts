import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DraftingError } from '@/drafting/drafting-error'
import { parseLength } from '@/drafting/lengths'

function refusal(text: string, unit: 'in' | 'cm' = 'in'): DraftingError {
  try {
    parseLength(text, unit)
  } catch (error) {
    if (error instanceof DraftingError) return error
    throw error
  }
  throw new Error(`"${text}" was read as a length`)
}

describe('reading a length', () => {
  it.each([
    ['36 1/2', 927.1],
    ['36-1/2', 927.1],
    ['36½', 927.1],
    ['36 ½', 927.1],
    ['36.5in', 927.1],
    ['36.5"', 927.1],
    ['36 1/2"', 927.1],
    ['36 1/2 in', 927.1],
    ['36 1/2 Inches', 927.1],
    ['36,5 in.', 927.1],
    ["36 1/2''", 927.1],
    ['  36\u20091\u20442\u202fin ', 927.1],
    ['36⅛', 917.575],
    ['36⅜', 923.925],
    ['36⅝', 930.275],
    ['36⅞', 936.625],
    ['36 1⁄8', 917.575],
    ['1/2', 12.7],
    ['⅜', 9.525],
    ['.5', 12.7],
    ['92,7 cm', 927],
    ['92.7cm', 927],
    ['927mm', 927],
    ['1.05 m', 1050],
    [`3' 0 1/2"`, 927.1],
    ['3′ 0½″', 927.1],
    ['3 ft 1/2 in', 927.1],
    ["3'", 914.4],
    ["5'4", 1625.6],
    ['0', 0],
  ])('reads %s as %d mm', (text, mm) => {
    expect(parseLength(text, 'in')).toBe(mm)
  })

  it('reads a bare number in the unit it is given', () => {
    expect(parseLength('36 1/2', 'cm')).toBe(365)
    expect(parseLength('92,75', 'cm')).toBe(927.5)
  })

  it('reads a length that runs the other way', () => {
    expect(parseLength('-1/2', 'in')).toBe(-12.7)
    expect(parseLength('−2.5 cm', 'in')).toBe(-25)
    expect(Object.is(parseLength('-0', 'in'), 0)).toBe(true)
  })

  it.each([
    ['', 0, /nothing is typed/i],
    ['   ', 0, /nothing is typed/i],
    ['1,234', 1, /one or two digits/],
    ['12.345,6', 6, /not expected/],
    ['1/0', 2, /0 below the line/],
    ['36 1', 3, /second number/],
    ['36 1/', 3, /second number/],
    ['36 3/2', 3, /not less than one/],
    ['361/2', 0, /write 180 1\/2/],
    ['36.', 3, /missing after/],
    ['NaN', 0, /not a number/],
    ['Infinity', 0, /not a number/],
    ['1e308', 1, /not expected/],
    ['0x10', 1, /not expected/],
    ['36 yards', 3, /not expected/],
    ['36 in 2', 6, /second number/],
    ['--3', 1, /not a number/],
    ['-', 1, /missing/],
    ['36 -1/2', 3, /not expected/],
    ['3.5\' 2"', 0, /whole number/],
    [`3' 14"`, 3, /less than 12/],
    ["3' 2 cm", 3, /come inches/],
    ['99999 m', 0, /over 100 m/],
    ['1234567890123456', 0, /digits/],
    ['{"$gt":1}', 0, /not a number/],
  ])('refuses %j at %d', (text, position, reason) => {
    const error = refusal(text)
    expect(error.code).toBe('bad-length')
    expect(error.message).toMatch(reason)
    expect(error.problems[0]?.position).toBe(position)
  })

  it('refuses ten megabytes at once and without repeating them', () => {
    const start = performance.now()
    const error = refusal('9'.repeat(10_000_000))
    expect(performance.now() - start).toBeLessThan(50)
    expect(error.message.length).toBeLessThan(200)
  })

  it('names the field it was given', () => {
    expect(() => parseLength('x', 'in', 'bust')).toThrow(DraftingError)
    try {
      parseLength('x', 'in', 'bust')
    } catch (error) {
      expect((error as DraftingError).fields).toEqual(['bust'])
    }
  })

  it('answers any text with a finite length or a reason', () => {
    const text = fc.oneof(
      fc.string({ unit: 'grapheme', maxLength: 70 }),
      fc.string({ unit: fc.constantFrom(...`0123456789/.,-− ½⁄'"incmft`), maxLength: 14 }),
    )
    fc.assert(
      fc.property(text, fc.constantFrom('in' as const, 'cm' as const), (typed, unit) => {
        try {
          expect(Number.isFinite(parseLength(typed, unit))).toBe(true)
        } catch (error) {
          expect(error).toBeInstanceOf(DraftingError)
          expect((error as DraftingError).problems[0]?.message).toMatch(/\w{3}/)
        }
      }),
      { numRuns: 3000 },
    )
  })
})

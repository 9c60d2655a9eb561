import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Unit } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import { roundToTape } from '@/drafting/lengths'
import { evaluateFormula, explainFormula, parseFormula } from '@/drafting/rules'
import { evaluateArithmetic } from '../../support/arithmetic'

const kinds = { bust: 'length', waist: 'length', ease: 'length', share: 'number', slope: 'angle' } as const
const body = { bust: 889, waist: 711.2, ease: 80, share: 0.25, slope: 18 }

function sum(text: string, unit: Unit): string {
  const formula = parseFormula(text)
  return explainFormula(formula, body, kinds, unit, evaluateFormula(formula, body))
}

describe('the sum behind a rule', () => {
  it.each([
    ['bust / 6 + 1.5in', 'in', '35 ÷ 6 + 1 1/2 ≈ 7 3/8'],
    ['bust / 6 + 1.5in', 'cm', '88.9 ÷ 6 + 3.81 ≈ 18.6'],
    ['bust / 5 + 1.5in', 'in', '35 ÷ 5 + 1 1/2 = 8 1/2'],
    ['(bust + ease) / 4', 'in', '(35 + 3.15) ÷ 4 ≈ 9 1/2'],
    ['(bust + ease) / 4', 'cm', '(88.9 + 8) ÷ 4 ≈ 24.2'],
    ['bust - (waist - ease)', 'cm', '88.9 − (71.12 − 8) ≈ 25.8'],
    ['bust × (waist / (1/2 in)) / 100', 'in', '35 × 28 ÷ (1/2) ÷ 100 ≈ 19 5/8'],
    ['bust - -1/2 in', 'in', '35 − (−1/2) = 35 1/2'],
    ['min(bust, waist + 2in) / 2', 'in', 'min(35, 28 + 2) ÷ 2 = 15'],
    ['waist / (2 × pi × share)', 'in', '28 ÷ (2 × 3.1416 × 0.25) ≈ 17 7/8'],
    ['bust', 'in', '35 = 35'],
  ] as const)('%s in %s', (text, unit, expected) => {
    expect(sum(text, unit)).toBe(expected)
  })

  it('ends in what the tape made of it', () => {
    const formula = parseFormula('bust / 6 + 1.5in')
    const taped = roundToTape(evaluateFormula(formula, body), 6.35)
    expect(explainFormula(formula, body, kinds, 'in', taped)).toBe('35 ÷ 6 + 1 1/2 ≈ 7 1/4')
  })

  it('writes angles in degrees and shares bare', () => {
    const angle = parseFormula('share × 90° + slope / 4')
    expect(explainFormula(angle, body, kinds, 'in', 27, { measures: 'angle' })).toBe(
      '0.25 × 90° + 18° ÷ 4 = 27°',
    )
    const share = parseFormula('waist / bust')
    expect(explainFormula(share, body, kinds, 'cm', 0.8, { measures: 'number' })).toBe('71.12 ÷ 88.9 = 0.8')
  })

  it('says what is missing instead of a sum', () => {
    expect(() => explainFormula(parseFormula('hip / 4'), body, kinds, 'in', 250)).toThrow(DraftingError)
  })

  it('is true: worked out by hand it gives the length within its rounding', () => {
    const formulas = [
      'bust / 6 + 1.5in',
      '(bust + ease) / 4 − 1/2 in',
      'waist / (2 × pi × share)',
      'sqrt(bust × waist) − ease',
      'bust / (waist / ease)',
      'max(bust / 8 + 9.5 cm, waist − 2 × ease)',
      '−(waist − bust) × share + ease / (1/2)',
      'bust − (waist − (ease − 1 3/8 in))',
      '(bust / 1 cm × 0.3 + 1) × 1 cm',
    ].map((text) => parseFormula(text))
    const values = fc.record({
      bust: fc.double({ min: 680, max: 1650, noNaN: true }),
      waist: fc.double({ min: 500, max: 1780, noNaN: true }),
      ease: fc.oneof(fc.double({ min: 10, max: 200, noNaN: true }), fc.constantFrom(50.8, 76.2, 80)),
      share: fc.constantFrom(0.25, 0.5, 0.75, 1, 1.5, 1 / 3),
      slope: fc.constant(18),
    })
    fc.assert(
      fc.property(
        fc.constantFrom(...formulas),
        values,
        fc.constantFrom<Unit>('in', 'cm'),
        (formula, drawn, unit) => {
          const length = evaluateFormula(formula, drawn)
          const text = explainFormula(formula, drawn, kinds, unit, length)
          const { left, sign, right } = evaluateArithmetic(text)
          const perUnit = unit === 'in' ? 25.4 : 10
          const half = unit === 'in' ? 1 / 16 : 0.05
          expect(Math.abs(left - length / perUnit), text).toBeLessThanOrEqual(half / 10 + 1e-9)
          expect(Math.abs(right - length / perUnit), text).toBeLessThanOrEqual(half + 1e-9)
          expect(Math.abs(left - right) < 1e-9, text).toBe(sign === '=')
        },
      ),
      { numRuns: 3000 },
    )
  })
})

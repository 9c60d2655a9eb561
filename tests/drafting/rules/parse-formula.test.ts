import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DraftingError } from '@/drafting/drafting-error'
import { checkFormulaKinds, evaluateFormula, explainFormula, parseFormula, type Kind } from '@/drafting/rules'

const body = { bust: 889, waist: 700, share: 0.25, slope: 18 }
const kinds = { bust: 'length', waist: 'length', share: 'number', slope: 'angle' } as const

function refusal(action: () => unknown): DraftingError {
  try {
    action()
  } catch (error) {
    if (error instanceof DraftingError) return error
    throw error
  }
  throw new Error('Nothing was refused')
}

describe('reading and working out a formula', () => {
  it.each([
    ['bust / 6 + 1.5in', 889 / 6 + 38.1],
    ['bust ÷ 6 + 1 1/2 in', 889 / 6 + 38.1],
    ['bust/6+1½"', 889 / 6 + 38.1],
    ['bust * 1 1/2', 889 * 1.5],
    ['2 cm', 20],
    ['1/2 in', 12.7],
    ['bust / 1/2', 889 / 2],
    ['35/6', 35 / 6],
    ['2 − 3 − 4', -5],
    ['2 - (3 - 4)', 3],
    ['24 / 2 / 3 × 2', 8],
    ['2 + 3 × 4', 14],
    ['-(bust - waist)', -189],
    ['- -3', 3],
    ['min(bust, waist, 60cm)', 600],
    ['max(bust, waist)', 889],
    ['sqrt(bust × bust)', 889],
    ['waist / (2 × pi × share)', 700 / (Math.PI / 2)],
    ['slope / 2 + 4°', 13],
    ['slope + 4 deg', 22],
  ])('%s', (text, expected) => {
    expect(Math.abs(evaluateFormula(parseFormula(text), body) - expected)).toBeLessThan(1e-9)
  })

  it('lists each name once, in order', () => {
    expect(parseFormula('waist + bust - waist + pi × min(hip, bust)').names).toEqual(['waist', 'bust', 'hip'])
  })

  it.each([
    ['', 0, /empty/],
    ['bust +', 6, /before the end/],
    ['(bust', 0, /never closed/],
    ['bust)', 4, /closes nothing/],
    ['bust 4', 5, /missing/],
    ['4 bust', 2, /missing/],
    ['1,5in', 1, /take a point/],
    ['min(1', 3, /never closed/],
    ['foo(3)', 0, /no function/],
    ['in', 0, /is a unit/],
    ['bust ^ 2', 5, /no meaning/],
    ['bust[0]', 4, /no meaning/],
    ['bust.constructor', 5, /missing after/],
    ['1 3/2 in', 2, /not less than one/],
    ['1 1/0 in', 4, /0 below/],
    ['1e400', 1, /missing/],
    ['sqrt(1, 2)', 6, /at most 1/],
    ['min', 0, /in brackets/],
    ['`bust`', 0, /no meaning/],
  ])('refuses %j at %d', (text, position, reason) => {
    const error = refusal(() => parseFormula(text, 'armholeDepth'))
    expect(error.code).toBe('bad-formula')
    expect(error.fields).toEqual(['armholeDepth'])
    expect(error.problems[0]?.position).toBe(position)
    expect(error.message).toMatch(reason)
  })

  it.each([
    ['bust / (waist - waist)', 5, /"\(waist - waist\)" is zero/],
    ['bust + 1 / (1 / (1 / 0.0))', 19, /divided by zero/],
    ['min(5cm, bust / 0)', 14, /divided by zero/],
    ['sqrt(waist - bust)', 0, /below zero/],
    ['bust + hip', 7, /no value for "hip"/],
    [Array.from({ length: 25 }, () => '99999999999999').join('×'), 0, /too large/],
  ])('names where %s fails', (text, position, reason) => {
    const error = refusal(() => evaluateFormula(parseFormula(text), body, 'quarter'))
    expect(error.code).toBe('bad-formula')
    expect(error.fields).toEqual(['quarter'])
    expect(error.message).toMatch(reason)
    expect(error.problems[0]?.position).toBe(position)
  })

  it.each([
    '__proto__',
    'constructor',
    'toString',
    'hasOwnProperty',
    'valueOf',
    '__defineGetter__',
    'prototype',
  ])('knows nothing of %s', (name) => {
    const formula = parseFormula(`bust + ${name}`)
    expect(refusal(() => evaluateFormula(formula, body)).message).toContain(`"${name}"`)
    expect(checkFormulaKinds(formula, kinds, 'length')[0]?.message).toContain('not known')
  })

  it('refuses values that are no finite numbers', () => {
    const formula = parseFormula('bust / 2')
    expect(refusal(() => evaluateFormula(formula, { bust: NaN })).message).toMatch(/finite/)
    expect(refusal(() => evaluateFormula(formula, { bust: Infinity })).message).toMatch(/finite/)
    expect(refusal(() => evaluateFormula(formula, {})).message).toMatch(/no value/)
  })

  it.each([
    ['deep brackets', '('.repeat(100_000)],
    ['minus after minus', '-'.repeat(100_000)],
    ['nested calls', 'min('.repeat(499 / 4)],
    ['ten megabytes', 'bust+'.repeat(2_000_000)],
    ['spaces', ' '.repeat(499)],
    ['a long sum', '1+'.repeat(249) + '1'],
    ['digits', '9'.repeat(499)],
    ['letters', 'é'.repeat(499)],
    ['fractions', '1 1/2 '.repeat(80)],
  ])('stops within 100 ms at %s', (_, text) => {
    const start = performance.now()
    try {
      evaluateFormula(parseFormula(text), body)
    } catch (error) {
      expect(error).toBeInstanceOf(DraftingError)
    }
    expect(performance.now() - start).toBeLessThan(100)
  })

  it('answers any text with a finite number or a placed reason, quickly', () => {
    const piece = fc.constantFrom(
      ...[
        'bust',
        'waist',
        'share',
        'slope',
        'hip',
        '__proto__',
        'min(',
        'max(',
        'sqrt(',
        '(',
        ')',
        ',',
        '+',
        '-',
        '×',
        '/',
      ],
      ...['0', '1', '2.5', '1 1/2', '½', 'in', 'cm', '°', ' ', '1/0', 'pi', '.', '"'],
    )
    const text = fc.oneof(
      fc.array(piece, { maxLength: 25 }).map((pieces) => pieces.join('')),
      fc.string({ unit: 'binary', maxLength: 520 }),
    )
    const measures = fc.constantFrom<Kind>('length', 'angle', 'number')
    fc.assert(
      fc.property(text, measures, (typed, wanted) => {
        const start = performance.now()
        try {
          const formula = parseFormula(typed)
          const problems = checkFormulaKinds(formula, kinds, wanted)
          const value = evaluateFormula(formula, body)
          expect(Number.isFinite(value)).toBe(true)
          if (problems.length === 0) explainFormula(formula, body, kinds, 'in', value, { measures: wanted })
        } catch (error) {
          expect(error).toBeInstanceOf(DraftingError)
          const position = (error as DraftingError).problems[0]?.position ?? -1
          expect(position).toBeGreaterThanOrEqual(0)
          expect(position).toBeLessThanOrEqual(typed.length)
        }
        expect(performance.now() - start).toBeLessThan(100)
      }),
      { numRuns: 4000 },
    )
  })
})

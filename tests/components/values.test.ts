import { describe, expect, it } from 'vitest'
import { formatValue, nudged, parseValue, shownText, typedWithUnit } from '@/components/studio/values'
import { lengthInWords } from '@/components/studio/lengths-in-words'

describe('what is typed in a tag', () => {
  it.each([
    ['7 3/8', 187.325],
    ['7 3⁄8', 187.325],
    ['7⅜', 187.325],
    ['18.5 cm', 185],
    ['-1/2', -12.7],
  ])('reads %s', (text, mm) => {
    expect(parseValue('length', text, 'in', 'depth')).toBeCloseTo(mm, 9)
  })

  it.each(['', '1/0', '36 1', 'deep'])('refuses "%s" with a reason', (text) => {
    expect(() => parseValue('length', text, 'in', 'depth')).toThrow(/\w/)
  })

  it.each([
    ['1/4', 0.25],
    ['0.25', 0.25],
    ['1 1/2', 1.5],
    ['25 %', 0.25],
  ])('reads the share %s', (text, share) => {
    expect(parseValue('share', text, 'in', 'flare')).toBeCloseTo(share, 9)
  })

  it('reads an angle with or without its sign', () => {
    expect(parseValue('angle', '22 1/2°', 'in', 'slope')).toBe(22.5)
    expect(parseValue('angle', '18', 'in', 'slope')).toBe(18)
  })

  it('shows a length as it was typed while the unit is the same, and worked out in the other', () => {
    expect(shownText('length', 927.1, '36-1/2 in', 'in')).toBe('36-1/2')
    expect(shownText('length', 927.1, '36-1/2 in', 'cm')).toBe('92.7')
  })

  it('drops the typed text once the value is another', () => {
    expect(shownText('length', 254, '36 1/2 in', 'in')).toBe('10')
  })

  it('keeps the unit with a bare number', () => {
    expect(typedWithUnit('length', '36½', 'in')).toBe('36½ in')
    expect(typedWithUnit('length', '92,7 cm', 'in')).toBe('92,7 cm')
  })

  it('writes shares of a circle as fractions', () => {
    expect([0.25, 0.375, 1, 1.5, 1 / 3].map((share) => formatValue('share', share, 'in'))).toEqual([
      '1/4',
      '3/8',
      '1',
      '1 1/2',
      '1/3',
    ])
  })

  it('nudges by an eighth or a millimetre and lands on the tape', () => {
    expect(nudged('length', 100, 'in', 1, false)).toBeCloseTo(32 * 3.175, 9)
    expect(nudged('length', 100.2, 'cm', 1, false)).toBe(101)
    expect(nudged('length', 100, 'cm', -1, true)).toBe(90)
    expect(nudged('length', 0, 'in', 1, true)).toBeCloseTo(25.4, 9)
  })
})

describe('lengths for the ear', () => {
  it.each([
    [114.3, 'in', '4½ inches'],
    [25.4, 'in', '1 inch'],
    [12.7, 'in', '½ inch'],
    [0, 'in', '0 inches'],
    [-12.7, 'in', '−½ inch'],
    [25.4 * 1.5, 'in', '1½ inches'],
    [114, 'cm', '11.4 centimetres'],
    [10, 'cm', '1 centimetre'],
  ] as const)('says %d mm in %s as %s', (mm, unit, words) => {
    expect(lengthInWords(mm, unit)).toBe(words)
  })
})

import { describe, expect, it } from 'vitest'
import { checkFormulaKinds, parseFormula, type Kind } from '@/drafting/rules'

const kinds = {
  bust: 'length',
  waist: 'length',
  armholeDepth: 'length',
  share: 'number',
  slope: 'angle',
} as const

function messages(text: string, wanted: Kind = 'length'): readonly string[] {
  return checkFormulaKinds(parseFormula(text), kinds, wanted).map(({ message }) => message)
}

describe('what may be put together', () => {
  it.each<[string, Kind]>([
    ['bust / 6 + 1.5in', 'length'],
    ['(bust + 8cm) / 4', 'length'],
    ['sqrt(bust × waist)', 'length'],
    ['sqrt(bust × bust − waist × waist)', 'length'],
    ['bust × waist / (bust + waist)', 'length'],
    ['bust / waist', 'number'],
    ['share × 90°', 'angle'],
    ['bust / 1cm × 1° / 4 − 6.5°', 'angle'],
    ['waist / (2 × pi × share)', 'length'],
    ['min(bust / 8 + 9.5 cm, armholeDepth)', 'length'],
  ])('%s is good as a %s', (text, wanted) => {
    expect(messages(text, wanted)).toEqual([])
  })

  it.each<[string, Kind, number, RegExp]>([
    ['bust + 4', 'length', 5, /adds a length and a bare number. Give "4" a unit, such as 4 cm/],
    ['4 - bust', 'length', 2, /takes apart a bare number and a length. Give "4"/],
    ['slope + 4', 'angle', 6, /Give "4" a unit, such as 22.5°/],
    ['bust × waist', 'length', 0, /gives an area, and a length is due/],
    ['bust / waist', 'length', 0, /gives a bare number, and a length is due/],
    ['4', 'length', 0, /Give "4" a unit/],
    ['slope', 'length', 0, /gives an angle, and a length is due/],
    ['bust + slope', 'length', 5, /adds a length and an angle/],
    ['bust + waist × waist', 'length', 5, /adds a length and an area/],
    ['min(bust, 4)', 'length', 10, /compares a length and a bare number. Give "4" a unit/],
    ['sqrt(bust)', 'length', 0, /mixture/],
    ['bust / 0', 'length', 5, /"0" is zero/],
    ['bust / (2 - 2)', 'length', 5, /"\(2 - 2\)" is zero/],
    ['bsut / 6', 'length', 0, /"bsut" is not known here. Did you mean bust\?/],
    ['depth + 1 cm', 'length', 0, /Did you mean armholeDepth\?/],
    ['elbow / 6', 'length', 0, /"elbow" is not known here\.$/],
  ])('%s is refused as a %s', (text, wanted, position, reason) => {
    const problems = checkFormulaKinds(parseFormula(text), kinds, wanted, 'armhole')
    expect(problems).toHaveLength(1)
    expect(problems[0]).toMatchObject({ field: 'armhole', code: 'bad-formula', position })
    expect(problems[0]?.message).toMatch(reason)
  })

  it('names every unknown name once, and judges nothing built on one', () => {
    expect(messages('hpi + hpi / 2 + knee')).toHaveLength(2)
  })
})

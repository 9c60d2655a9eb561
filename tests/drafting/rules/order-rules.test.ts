import { describe, expect, it } from 'vitest'
import { DraftingError } from '@/drafting/drafting-error'
import { checkRule, orderRules, parseFormula, type Formula } from '@/drafting/rules'

function rules(texts: Readonly<Record<string, string>>): Readonly<Record<string, Formula>> {
  return Object.fromEntries(Object.entries(texts).map(([id, text]) => [id, parseFormula(text)]))
}

describe('rules worked out from each other', () => {
  it('come after what they need, otherwise as given', () => {
    const order = orderRules(
      rules({ underarm: 'quarter + depth', depth: 'bust / 6', quarter: '(bust + ease) / 4', hem: 'waist' }),
    )
    expect(order).toEqual(['quarter', 'depth', 'underarm', 'hem'])
  })

  it('are refused in a circle, which is named', () => {
    try {
      orderRules(rules({ a: 'bust + b', b: 'c / 2', c: 'a - 1cm', d: 'd + bust', e: 'bust' }))
      expect.unreachable()
    } catch (error) {
      const { problems } = error as DraftingError
      expect(problems.map(({ message }) => message)).toEqual([
        'These rules are worked out from each other in a circle: a → b → c → a.',
        '"d" is worked out from itself.',
      ])
      expect(problems.map(({ field, position }) => [field, position])).toEqual([
        ['a', 7],
        ['d', 0],
      ])
    }
  })
})

describe('a stranger’s formula', () => {
  it('is judged within 100 ms, however many names it misspells', () => {
    const names = Array.from({ length: 200 }, (_, at) => `measurementNumber${at}OfAWorkroom`)
    const kinds = Object.fromEntries(names.map((name) => [name, 'length' as const]))
    // The processor's time, not the wall's: other programs may be busy.
    const start = process.cpuUsage()
    const text = names.map((name) => name.replace('Number', 'Nmuber')).join('+')
    const problems = checkRule('depth', text.slice(0, 500), 'length', { kinds, formulas: {} })
    const { user, system } = process.cpuUsage(start)
    expect((user + system) / 1000).toBeLessThan(100)
    expect(problems[0]?.message).toContain('Did you mean measurementNumber0OfAWorkroom')
  })
})

describe('one new formula among the rules of a garment', () => {
  const surroundings = {
    kinds: { bust: 'length', depth: 'length', underarm: 'length', flare: 'angle' } as const,
    formulas: rules({ depth: 'bust / 6', underarm: 'depth + 2cm' }),
  }

  it('is good', () => {
    expect(checkRule('depth', 'bust / 8 + 9.5 cm', 'length', surroundings)).toEqual([])
  })

  it.each([
    ['bust / 6 +', /number, a name or a bracket/],
    ['bsut / 6', /Did you mean bust/],
    ['bust / 6 + 2', /Give "2" a unit/],
    ['underarm - 2 cm', /in a circle: depth → underarm → depth/],
  ])('%s is refused at its field', (text, reason) => {
    const problems = checkRule('depth', text, 'length', surroundings)
    expect(problems).toHaveLength(1)
    expect(problems[0]?.field).toBe('depth')
    expect(problems[0]?.message).toMatch(reason)
  })
})

import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkFormula, checkMethodRules, draftGarment, DraftingError, garments } from '@/drafting'
import { evaluateFormula, orderRules, parseFormula, type Formula } from '@/drafting/rules'
import { sanityBodies } from '../../support/bodies'

/** Milliseconds of the processor, whatever else the machine does meanwhile. */
function worked(work: () => void): number {
  const before = process.cpuUsage()
  work()
  const { user, system } = process.cpuUsage(before)
  return (user + system) / 1000
}

/** Rules r0…rn, each worked out from some of those after it. */
const chains = fc
  .array(fc.array(fc.nat({ max: 5 }), { maxLength: 4 }), { minLength: 2, maxLength: 40 })
  .map((steps) =>
    steps.map((ahead, index): [string, Formula] => {
      const names = ahead.map((step) => index + 1 + step).filter((other) => other < steps.length)
      const text = [`${index + 1}mm`, ...names.map((other) => `r${other} / 2`)].join(' + ')
      return [`r${index}`, parseFormula(text)]
    }),
  )

function workOut(formulas: readonly [string, Formula][]): Record<string, number> {
  const byId = Object.fromEntries(formulas)
  const values: Record<string, number> = {}
  for (const id of orderRules(byId)) values[id] = evaluateFormula(byId[id] as Formula, values)
  return values
}

describe('rules worked out from each other', () => {
  it('come to the same in whatever order they are written', () => {
    fc.assert(
      fc.property(
        chains.chain((all) =>
          fc.tuple(fc.constant(all), fc.shuffledSubarray(all, { minLength: all.length })),
        ),
        ([written, shuffled]) => {
          expect(workOut(shuffled)).toEqual(workOut(written))
        },
      ),
      { numRuns: 300 },
    )
  })

  it('come each after those it is worked out from', () => {
    fc.assert(
      fc.property(chains, (written) => {
        const order = orderRules(Object.fromEntries(written))
        for (const [id, { names }] of written)
          for (const name of names) expect(order.indexOf(name)).toBeLessThan(order.indexOf(id))
      }),
      { numRuns: 300 },
    )
  })
})

const each = garments.map((garment) => [garment.id, garment] as const)

describe('a garment whose every rule a stranger wrote', () => {
  it.each(each)('%s: rules all tangled up are refused within 100 ms, with the circle', (id, garment) => {
    const tangled = Object.fromEntries(
      garment.rules.map((rule) => {
        const alike = garment.rules.filter((other) => other.kind === rule.kind)
        // As many as 500 characters hold, itself among them where it is alone of its kind.
        return [
          rule.id,
          alike
            .slice(0, 20)
            .map((other) => other.id)
            .join(' + '),
        ]
      }),
    )
    let problems: readonly { code: string; message: string; position?: number }[] = []
    const time = worked(() => {
      try {
        draftGarment({ garment: id, measurements: sanityBodies.one, rules: tangled })
      } catch (error) {
        if (!(error instanceof DraftingError)) throw error
        problems = error.problems
      }
    })
    expect(time).toBeLessThan(100)
    expect(problems.length).toBeGreaterThan(0)
    for (const { code, message, position } of problems) {
      expect(code).toBe('bad-formula')
      expect(message).toMatch(/circle|from itself/)
      expect(position).toBeGreaterThanOrEqual(0)
    }
  })

  it.each(each)('%s: rules as long and deep as they may be are answered within 100 ms', (id, garment) => {
    const deep = `${'('.repeat(38)}1cm${')'.repeat(38)}`
    const long = Object.fromEntries(
      garment.rules.map((rule) => [rule.id, `${deep} ${'+ bust / 9999'.repeat(30)}`]),
    )
    const time = worked(() => {
      checkMethodRules({
        [id]: Object.entries(long).map(([rule, formula]) => ({ id: rule, formula, source: '' })),
      })
    })
    expect(time).toBeLessThan(100)
  })

  it.each(each)('%s: any text in the place of a rule is good or has its place', (id, garment) => {
    const word = fc.constantFrom(
      ...garment.rules.map((rule) => rule.id),
      ...garment.design.map((value) => value.id),
      ...garment.needs,
      ...[
        'constructor',
        '__proto__',
        'nobody',
        '2cm',
        '1/2 in',
        '°',
        '3',
        '(',
        ')',
        '+',
        '-',
        '*',
        '/',
        'min(',
        ',',
      ],
    )
    const text = fc.oneof(
      fc.array(word, { maxLength: 12 }).map((words) => words.join(' ')),
      fc.string({ unit: 'binary', maxLength: 60 }),
    )
    fc.assert(
      fc.property(fc.constantFrom(...garment.rules), text, (rule, formula) => {
        for (const problem of checkFormula(id, rule.id, formula)) {
          expect(problem.field).toBe(rule.id)
          expect(problem.message.length).toBeGreaterThan(10)
          expect(problem.position).toBeGreaterThanOrEqual(0)
          expect(problem.position).toBeLessThanOrEqual(formula.length)
        }
      }),
      { numRuns: 150 },
    )
  })
})

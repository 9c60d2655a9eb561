import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DraftOrder, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { fewer, holdsForDrafts, holdsForOrders, runs } from '../support/laws/hold'
import { nothingClamped, outOfRange, refusalFaults, refusesWell } from '../support/laws/law-10-refusals'
import { randomOrder } from '../support/laws/orders'
import { attempt } from '../support/laws/redraft'

const each = engine.garments.map((garment): [string, GarmentDefinition] => [garment.id, garment])

/** What a stranger may send in the place of a number. */
const nonsense: fc.Arbitrary<unknown> = fc.oneof(
  fc.constantFrom<unknown>(
    NaN,
    Infinity,
    -Infinity,
    -1,
    0,
    1e308,
    5e-324,
    null,
    '',
    '36 1/2',
    '920',
    true,
    [],
    [920],
    {},
    { valueOf: 920 },
  ),
  fc.anything(),
)

const names = fc.constantFrom(
  '__proto__',
  'constructor',
  'toString',
  'hasOwnProperty',
  'prototype',
  'bustt',
  'Bust',
  '',
  ' bust',
  'a'.repeat(5000),
)

const formulas = fc.oneof(
  fc.constantFrom(
    '',
    '   ',
    '1',
    'bust',
    'bust * bust',
    'bust / 0',
    'bust / (waist - waist)',
    '1e400 * bust',
    'sqrt(0 - bust / 1cm) * 1cm',
    'constructor',
    '__proto__',
    'bust.constructor',
    'this',
    'bust(',
    '('.repeat(600),
    '9'.repeat(600),
    'min()',
    'max(bust',
    'nobody / 2',
    'quarterBust',
    'neckWidth',
    'armholeDepth',
    'radius',
    'waistEdge',
    '0cm - bust',
    'bust * 1000',
    '１０cm',
    '90°',
  ),
  fc.string({ maxLength: 40 }),
)

/** Puts something at a place of an order, without minding what belongs there. */
type Spoil = (order: Record<string, unknown>) => void

function put(order: Record<string, unknown>, part: string, id: string, value: unknown): void {
  const inner = order[part]
  if (typeof inner !== 'object' || inner === null) return
  Object.defineProperty(inner, id, { value, enumerable: true, configurable: true, writable: true })
}

function spoils(garment: GarmentDefinition): fc.Arbitrary<Spoil> {
  const measurement = fc.oneof(fc.constantFrom(...garment.needs, ...garment.estimates), names)
  const style = fc.oneof(fc.constantFrom(...garment.design.map(({ id }) => id)), names)
  const rule = fc.oneof(fc.constantFrom(...garment.rules.map(({ id }) => id)), names)
  const into = (part: string, id: fc.Arbitrary<string>, value: fc.Arbitrary<unknown>): fc.Arbitrary<Spoil> =>
    fc.tuple(id, value).map(
      ([where, what]) =>
        (order) =>
          put(order, part, where, what),
    )
  const whole = fc
    .tuple(
      fc.constantFrom(
        ...['garment', 'measurements', 'design', 'rules', 'corrections', 'unit', 'tape'],
        ...['method', 'ownMeasurements', 'remedies'],
      ),
      nonsense,
    )
    .map(([where, what]): Spoil => (order) => {
      order[where] = what
    })
  const correction = fc
    .record(
      {
        id: fc.oneof(fc.string(), nonsense),
        on: fc.oneof(
          fc.record({
            piece: fc.constantFrom('front', 'panel', '__proto__', 'sleeve'),
            mark: fc.constantFrom('underarm', 'sideNeck', 'nobody', 'constructor'),
          }),
          fc.record({
            seam: fc.constantFrom('side', 'shoulder', '__proto__'),
            level: fc.oneof(fc.double(), nonsense),
          }),
          nonsense,
        ),
        by: fc.oneof(
          fc.record({ x: fc.double(), y: fc.double() }),
          fc.double({ min: -200, max: 200 }),
          nonsense,
        ),
      },
      { requiredKeys: [] },
    )
    .map((one): Spoil => (order) => {
      order.corrections = [one]
    })
  const methodRule = fc.record(
    { id: fc.oneof(rule, nonsense), formula: fc.oneof(formulas, nonsense) },
    { requiredKeys: [] },
  )
  const method = fc
    .record(
      {
        id: fc.oneof(fc.constantFrom('handbook', 'nobody'), nonsense),
        rules: fc.oneof(fc.array(methodRule), nonsense),
      },
      { requiredKeys: [] },
    )
    .map((one): Spoil => (order) => {
      order.method = one
    })
  const remedies = fc
    .array(
      fc.record({ id: fc.oneof(fc.constantFrom('round-back', 'large-arm'), nonsense), amount: nonsense }),
    )
    .map((list): Spoil => (order) => {
      order.remedies = list
    })
  return fc.oneof(
    method,
    remedies,
    into('measurements', measurement, nonsense),
    into('design', style, nonsense),
    into('rules', rule, fc.oneof(formulas, nonsense)),
    whole,
    correction,
  )
}

/** Every number of a draft is finite. */
function expectFinite(draft: unknown): void {
  JSON.stringify(draft, (key, value: unknown) => {
    if (typeof value === 'number' && !Number.isFinite(value)) throw new Error(`${key} is ${value}`)
    return value
  })
}

function expectDraftOrRefusal(order: DraftOrder): void {
  const result = attempt(order, engine)
  if (!(result instanceof Error)) return expectFinite(result)
  expect(result).toBeInstanceOf(engine.DraftingError)
  expect(refusalFaults(result, order, engine)).toEqual([])
}

describe('Law 10: what cannot be drafted is refused with every field at fault', () => {
  it.each(each)(
    '%s: an order spoilt in up to four places is drafted or refused, never anything else',
    (_, garment) => {
      fc.assert(
        fc.property(fc.array(spoils(garment), { minLength: 1, maxLength: 4 }), (faults) => {
          const order: Record<string, unknown> = {
            garment: garment.id,
            measurements: { ...sanityBodies.one },
            design: {},
            rules: {},
          }
          for (const spoil of faults) spoil(order)
          expectDraftOrRefusal(order as unknown as DraftOrder)
        }),
        { numRuns: 5 * runs, endOnFailure: true },
      )
    },
  )

  it('anything at all in the place of an order', () => {
    fc.assert(
      fc.property(fc.anything(), (order) => {
        const result = attempt(order as DraftOrder, engine)
        expect(result).toBeInstanceOf(engine.DraftingError)
      }),
      { numRuns: runs },
    )
  })

  it('the handles of a spoilt order are refused the same way', () => {
    fc.assert(
      fc.property(spoils(engine.garments[0] as GarmentDefinition), (spoil) => {
        const order: Record<string, unknown> = {
          garment: 'flared-dress',
          measurements: { ...sanityBodies.one },
          design: {},
          rules: {},
        }
        spoil(order)
        try {
          expectFinite(engine.handles(order as unknown as DraftOrder))
        } catch (error) {
          expect(error).toBeInstanceOf(engine.DraftingError)
        }
      }),
      { numRuns: fewer(2), endOnFailure: true },
    )
  })

  it('names everything that is wrong at once', () => {
    const order = {
      garment: 'flared-dress',
      measurements: { ...sanityBodies.one, bust: 92, hip: NaN, waist: undefined },
      design: { neckWidening: -3, neckShape: 'heart', colour: 'red' },
      rules: { armholeDepth: 'bust /', quarterBust: 'bust * bust', nothing: '1cm' },
      corrections: [{ id: 'far', on: { piece: 'front', mark: 'underarm' }, by: { x: 900, y: 0 } }],
      unit: 'ft',
      tape: -1,
    }
    const result = attempt(order as unknown as DraftOrder, engine)
    if (!(result instanceof engine.DraftingError)) throw new Error('It was drafted.')
    for (const field of [
      'bust',
      'hip',
      'waist',
      'neckWidening',
      'neckShape',
      'colour',
      'rules.nothing',
      'corrections.far',
      'unit',
      'tape',
    ]) {
      expect(result.fields).toContain(field)
    }
    expect(result.problems.find((problem) => problem.field === 'bust')).toMatchObject({
      code: 'out-of-range',
      min: 680,
      max: 1650,
    })
    expect(result.problems.find((problem) => problem.field === 'waist')?.code).toBe('missing-measurement')
  })

  it('names every formula at fault, with its place, and all rules of a circle', () => {
    const measurements = sanityBodies.one
    const faulty = attempt(
      {
        garment: 'flared-dress',
        measurements,
        rules: { armholeDepth: 'bust / ', quarterBust: 'bust * bust', halfShoulder: 'shoulders / 2' },
      },
      engine,
    )
    if (!(faulty instanceof engine.DraftingError)) throw new Error('It was drafted.')
    expect(faulty.code).toBe('bad-formula')
    expect(faulty.fields.toSorted()).toEqual(['armholeDepth', 'halfShoulder', 'quarterBust'])
    expect(faulty.problems.every((problem) => problem.position !== undefined)).toBe(true)
    const circle = attempt(
      {
        garment: 'flared-dress',
        measurements,
        rules: { neckWidth: 'halfShoulder / 3', halfShoulder: 'neckWidth × 3' },
      },
      engine,
    )
    if (!(circle instanceof engine.DraftingError)) throw new Error('It was drafted.')
    expect(circle.code).toBe('bad-formula')
    expect(circle.message).toMatch(/neckWidth|halfShoulder/)
  })

  describe('what lies beyond its range is refused by name', () => holdsForOrders(outOfRange, { by: 20 }))

  describe('a refusal names a range that works', () => holdsForOrders(refusesWell, { by: 1 }))
})

describe('Law 10: nothing is clamped silently', () => holdsForDrafts(nothingClamped))

/** Share of orders that are refused, with the fields that were named. */
function refused(orders: readonly DraftOrder[]): {
  readonly share: number
  readonly fields: Record<string, number>
} {
  const fields: Record<string, number> = {}
  let count = 0
  for (const order of orders) {
    const result = attempt(order, engine)
    if (!(result instanceof Error)) continue
    count += 1
    for (const field of result.fields) fields[field] = (fields[field] ?? 0) + 1
  }
  return { share: count / orders.length, fields }
}

describe('few orders are refused', () => {
  it.each(each)('%s: at most 5 % of plausible bodies in random styles', (_, garment) => {
    const { share, fields } = refused(fc.sample(randomOrder(garment), { numRuns: 2 * runs, seed: 1 }))
    expect(share, JSON.stringify(fields)).toBeLessThanOrEqual(0.05)
  })

  it.each(each)('%s: at most 1 % of plausible bodies in its default style', (_, garment) => {
    const orders = fc.sample(randomOrder(garment), { numRuns: 2 * runs, seed: 2 })
    const { share, fields } = refused(orders.map(({ design: _style, ...order }) => order))
    expect(share, JSON.stringify(fields)).toBeLessThanOrEqual(0.01)
  })
})

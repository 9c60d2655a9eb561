import { describe, expect, it } from 'vitest'
import {
  checkFormula,
  draftGarment,
  DraftingError,
  garments,
  measurements,
  type DraftOrder,
  type OwnMeasurement,
} from '@/drafting'
import { sanityBodies } from '../../support/bodies'

const blades: OwnMeasurement = {
  id: 'across_blades',
  name: 'Across the shoulder blades',
  how: 'Across the back at the fullest of the shoulder blades.',
  min: 280,
  max: 480,
}
const order: DraftOrder = {
  garment: 'flared-dress',
  measurements: { ...sanityBodies.one, across_blades: 366 },
  ownMeasurements: [blades],
  rules: { halfShoulder: 'across_blades / 2 + 1cm' },
}

function problemsOf(of: unknown) {
  try {
    draftGarment(of as DraftOrder)
  } catch (error) {
    if (error instanceof DraftingError) return error.problems
    throw error
  }
  throw new Error('It was drafted.')
}

describe('measurements that a workroom takes and the engine does not know', () => {
  it('may stand in a formula; the sum shows them and the step lists them', () => {
    const draft = draftGarment(order)
    const step = draft.steps.find((one) => one.rule === 'halfShoulder')
    expect(step?.arithmetic).toBe('36.6 ÷ 2 + 1 = 19.3')
    expect(step?.uses).toContain('across_blades')
    expect(draft.used.across_blades).toEqual({ mm: 366 })
    const wider = draftGarment({ ...order, measurements: { ...order.measurements, across_blades: 376 } })
    expect(wider.pieces).not.toEqual(draft.pieces)
  })

  it('are not asked for while no formula names them', () => {
    const { rules: _none, measurements: card, ...rest } = order
    const { across_blades: _left, ...known } = card
    const draft = draftGarment({ ...rest, measurements: known })
    expect(draft).toEqual(draftGarment({ garment: 'flared-dress', measurements: sanityBodies.one }))
  })

  it('are asked for by name when one is missing, with how it is taken', () => {
    const problems = problemsOf({ ...order, measurements: sanityBodies.one })
    expect(problems).toMatchObject([
      { field: 'across_blades', code: 'missing-measurement', min: 280, max: 480 },
    ])
    expect(problems[0]?.message).toContain('at the fullest of the shoulder blades')
  })

  it.each([36.6, 3660, NaN, Infinity, '366', null])('are refused at %s, with their range', (value) => {
    const given = { ...order, measurements: { ...order.measurements, across_blades: value } }
    expect(problemsOf(given)).toMatchObject([
      { field: 'across_blades', code: 'out-of-range', min: 280, max: 480 },
    ])
  })

  it.each([
    ['a name of the engine’s kind', [{ ...blades, id: 'acrossBlades' }]],
    ['an inherited name', [{ ...blades, id: '__proto__' }]],
    ['a range upside down', [{ ...blades, min: 480, max: 280 }]],
    ['a range that is no number', [{ ...blades, max: NaN }]],
    ['no way of taking it', [{ ...blades, how: undefined }]],
    ['one name twice', [blades, blades]],
    ['no list', { blades }],
    ['nothing in the list', [null]],
  ])('are refused with %s', (_, ownMeasurements) => {
    const problems = problemsOf({ ...order, rules: {}, ownMeasurements })
    expect(problems[0]?.field).toMatch(/^ownMeasurements/)
  })

  it('are known to the check of a formula, and unknown without being brought along', () => {
    const check = (own: readonly OwnMeasurement[]) =>
      checkFormula('flared-dress', 'halfShoulder', 'across_blades / 2', { ownMeasurements: own })
    expect(check([blades])).toEqual([])
    expect(check([])).toMatchObject([{ field: 'halfShoulder', position: 0 }])
  })

  it('can never bear a name of the engine: none of those has an underscore', () => {
    const names = garments.flatMap(({ design, rules }) => [...design, ...rules].map(({ id }) => id))
    expect([...names, ...measurements.map(({ id }) => id)].filter((id) => id.includes('_'))).toEqual([])
  })
})

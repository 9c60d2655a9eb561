import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { completeCard, measurements, reviewMeasurements, sizeTables, type Card } from '@/drafting/body'
import { extremeBodies, plausibleBody, sanityBodies, sizeBodies } from '../../support/bodies'

const { one, two } = sanityBodies

function codes(card: Card): readonly string[] {
  return reviewMeasurements(card).map(({ code, fields }) => `${code} ${fields[0]}`)
}

describe('a plausible card', () => {
  it.each(sizeTables.flatMap(({ sizes }) => sizes))('$id has nothing odd', ({ card }) => {
    expect(reviewMeasurements(card)).toEqual([])
  })

  it.each(sizeBodies)('$name filled in by estimates has nothing odd', ({ card }) => {
    expect(reviewMeasurements(card)).toEqual([])
  })

  it.each(extremeBodies)('$name has nothing odd', ({ card }) => {
    expect(reviewMeasurements(card)).toEqual([])
  })

  it.each([one, two])('of the invented bodies has nothing odd, filled in or not', (card) => {
    expect(reviewMeasurements(card)).toEqual([])
    expect(reviewMeasurements(completeCard(card).card)).toEqual([])
  })

  it('is an empty one too', () => {
    expect(reviewMeasurements({})).toEqual([])
    expect(reviewMeasurements({ bust: NaN, mood: 3, waist: Infinity })).toEqual([])
  })

  it('keeps a natural waist that the navel-waist regression would flag', () => {
    // ANSUR II: waist at the navel = −10.5 + 1.02 × bust ± 16.1 cm would put this waist below 87 cm.
    expect(reviewMeasurements({ bust: 1110, waist: 800, hip: 1120 })).toEqual([])
  })
})

describe('likely slips', () => {
  it.each([
    ['bust', 36],
    ['waist', 29],
    ['hip', 38.5],
    ['neckBase', 14.5],
    ['napeToWaist', 16],
    ['armLength', 22.75],
    ['bustHeight', 10.5],
    ['upperArm', 11.25],
  ])('%s typed as %d centimetres was meant in inches', (id, inches) => {
    const [caution, ...others] = reviewMeasurements({ ...one, [id]: inches * 10 })
    expect(others).toEqual([])
    expect(caution?.code).toBe('inch-as-centimetre')
    expect(caution?.fields).toEqual([id])
    expect(caution?.message).toContain(`If ${inches} was meant in inches`)
  })

  it.each([
    ['bust', 92],
    ['waist', 66],
    ['waist', 74],
    ['neckBase', 37],
    ['armLength', 58],
  ])('%s typed as %d inches was meant in centimetres', (id, centimetres) => {
    const [caution, ...others] = reviewMeasurements({ ...one, [id]: centimetres * 25.4 })
    expect(others).toEqual([])
    expect(caution?.code).toBe('centimetre-as-inch')
    expect(caution?.message).toContain(
      `If ${centimetres} was meant in centimetres, that is ${centimetres} cm`,
    )
  })

  it.each(['bust', 'waist', 'hip', 'neckBase', 'upperArm'] as const)('half of %s is a doubled tape', (id) => {
    const [caution, ...others] = reviewMeasurements({ ...one, [id]: one[id] / 2 })
    expect(others).toEqual([])
    expect(caution?.code).toBe('half-girth')
    expect(caution?.message).toContain('tape was doubled')
  })

  it('half of a width is a width not doubled', () => {
    expect(codes({ ...one, acrossBack: 175 })).toEqual(['half-width acrossBack'])
  })

  it('half a girth that is itself possible is named when the rest of the card says so', () => {
    expect(codes({ bust: 1520, waist: 1360, hip: 760 })).toEqual(['half-girth hip'])
    expect(codes({ bust: 1460, hip: 760 })).toEqual(['hip-for-bust hip'])
  })

  it('a whole card in inches is one slip, not a guess each', () => {
    const inches = Object.fromEntries(Object.entries(one).map(([id, mm]) => [id, mm / 2.54]))
    const cautions = reviewMeasurements(inches)
    expect(cautions.map(({ code }) => code)).toEqual(Object.keys(one).map(() => 'inch-as-centimetre'))
    expect(cautions.every(({ message }) => !message.includes('doubled'))).toBe(true)
  })

  it('alone on a card, both guesses are told', () => {
    const [caution] = reviewMeasurements({ bust: 460 })
    expect(caution?.message).toContain('116.8 cm')
    expect(caution?.message).toContain('92 cm')
  })
})

describe('odd values', () => {
  it('are told with what would be usual, in the unit asked for', () => {
    const [caution] = reviewMeasurements({ bust: 914.4, neckBase: 469.9 }, 'in')
    expect(caution).toEqual({
      code: 'neckBase-for-bust',
      message:
        'Neck base 18 1/2 in is large for bust 36 in: 12 5/8 in to 16 1/8 in is usual. If it surprises you, measure both again.',
      fields: ['neckBase', 'bust'],
    })
  })

  it.each<[string, Card, readonly string[]]>([
    [
      'a front shorter than the back',
      { napeToWaist: 420, frontWaistLength: 400 },
      ['frontWaistLength-for-napeToWaist'],
    ],
    ['a chest wider than the back', { acrossBack: 340, acrossFront: 370 }, ['acrossFront-for-acrossBack']],
    ['a wrist as thick as a thin arm', { upperArm: 240, wrist: 190 }, ['wrist-for-upperArm']],
    ['a long arm on a short body', { height: 1500, armLength: 580 }, ['armLength-for-height']],
    ['a hip far below the waist', { waistToHip: 308 }, ['waistToHip']],
    [
      'a high hip larger than waist and hip',
      { waist: 740, hip: 980, highHip: 1010 },
      ['highHip-for-waist-and-hip'],
    ],
    ['a hand no larger than its wrist', { wrist: 160, hand: 160 }, ['hand-for-wrist']],
  ])('%s', (_, card, expected) => {
    expect(reviewMeasurements(card).map(({ code }) => code)).toEqual(expected)
  })

  it('one value against all the others is doubted once', () => {
    const cautions = reviewMeasurements({ ...one, bust: 1500 })
    expect(cautions).toHaveLength(1)
    expect(cautions[0]?.code).toBe('odd-one-out')
    expect(cautions[0]?.fields[0]).toBe('bust')
    expect(cautions[0]?.message).toContain('Measure it again first')
  })

  it('outside every range, with no slip to explain it, is told with the range', () => {
    expect(reviewMeasurements({ bust: 100 })[0]?.message).toContain('68 cm to 165 cm')
  })

  it('come in the order of the body and name fields on the card', () => {
    const anyCard = fc.dictionary(
      fc.constantFrom(...measurements.map(({ id }) => id)),
      fc.double({ min: 1, max: 3000, noNaN: true }),
    )
    fc.assert(
      fc.property(anyCard, fc.constantFrom('in' as const, 'cm' as const), (card, unit) => {
        const cautions = reviewMeasurements(card, unit)
        const order = cautions.map(({ fields }) => measurements.findIndex(({ id }) => id === fields[0]))
        expect(order).toEqual([...order].sort((a, b) => a - b))
        for (const { message, fields } of cautions) {
          expect(fields.every((id) => id in card)).toBe(true)
          expect(message).not.toMatch(/NaN|undefined|Infinity/)
        }
      }),
      { numRuns: 500 },
    )
  })
})

describe('random plausible bodies', () => {
  it('are full cards in range, and as varied as women are', () => {
    const bodies = fc.sample(plausibleBody(), { numRuns: 400, seed: 7 })
    const busts = bodies.map(({ bust = 0 }) => bust).sort((a, b) => a - b)
    expect(busts[20]).toBeLessThan(850)
    expect(busts[380]).toBeGreaterThan(1050)
    for (const body of bodies)
      for (const { id, min, max } of measurements.filter((one) => one.id !== 'armscye')) {
        expect(body[id], id).toBeGreaterThanOrEqual(min)
        expect(body[id], id).toBeLessThanOrEqual(max)
      }
  })
})

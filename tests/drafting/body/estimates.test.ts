import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { completeCard, estimates, measurementById, sizeTables, type Card } from '@/drafting/body'
import { checkFormulaKinds, evaluateFormula, parseFormula, type Kind } from '@/drafting/rules'
import { plausibleBody, sanityBodies } from '../../support/bodies'

const rules = Object.values(estimates)

describe('estimates', () => {
  it('stand for every measurement but the bust and the armscye', () => {
    expect(Object.keys(estimates)).toHaveLength(28)
    expect(Object.keys(estimates)).not.toContain('bust')
    expect(Object.keys(estimates)).not.toContain('armscye')
  })

  it.each(rules)(
    '$name has a source and is the formula it shows',
    ({ formula, source, uses, measurement, estimate }) => {
      const read = parseFormula(formula)
      const kinds = Object.fromEntries(uses.map((id): [string, Kind] => [id, 'length']))
      expect(checkFormulaKinds(read, kinds, 'length')).toEqual([])
      expect(source.length).toBeGreaterThan(5)
      const { min = 0, max = 0 } = measurementById(measurement) ?? {}
      fc.assert(
        fc.property(plausibleBody(), (body) => {
          const kept = Math.min(Math.max(evaluateFormula(read, body), min), max)
          expect(Math.abs(kept - estimate(body))).toBeLessThan(1e-6)
        }),
        { numRuns: 20 },
      )
    },
  )

  it('come close to both invented bodies', () => {
    // mm: an estimate is good when it is off by less than bodies commonly differ.
    const allowed: Readonly<Record<string, number>> = {
      hip: 75,
      armLength: 42,
      napeToWaist: 31,
      waist: 25,
      shoulderLength: 11,
    }
    for (const body of Object.values(sanityBodies))
      for (const [id, measured] of Object.entries(body).filter(([one]) => one in estimates)) {
        const others = Object.fromEntries(Object.entries(body).filter(([one]) => one !== id))
        const { card } = completeCard(others)
        expect(Math.abs((card[id] ?? 0) - measured), id).toBeLessThanOrEqual(allowed[id] ?? 11)
      }
  })

  it('follow the published girths within 2 cm', () => {
    const published = sizeTables.find(({ id }) => id === 'astm-d5585')?.sizes ?? []
    expect(published).toHaveLength(24)
    for (const { card } of published)
      for (const id of ['upperBust', 'underBust'])
        expect(Math.abs((estimates[id]?.estimate(card) ?? NaN) - (card[id] ?? 0)), id).toBeLessThan(20)
  })
})

describe('filling in a card', () => {
  it('keeps what was measured and names the rule of the rest', () => {
    const typed: Card = { bust: 920, hip: 1100 }
    const { card, estimatedBy } = completeCard(typed, ['upperArm', 'hip', 'wrist'])
    expect(card.hip).toBe(1100)
    expect(card.upperArm).toBe(0.312 * 1100 - 13)
    expect(estimatedBy).toEqual({ upperArm: 'upperArm-from-hip', wrist: 'wrist-from-upperArm' })
    expect(typed).toEqual({ bust: 920, hip: 1100 })
  })

  it('estimates one from another as far as it must', () => {
    const { card, estimatedBy } = completeCard({ bust: 920 })
    expect(Object.keys(card)).toHaveLength(29)
    expect(estimatedBy.centreFrontToWaist).toBe('centreFrontToWaist-from-frontWaistLength-and-neckBase')
    expect(estimatedBy.height).toBe('height-usual')
  })

  it('leaves open what nothing leads to', () => {
    const { card } = completeCard({ waist: 740, hip: 980, bust: NaN }, [
      'neckBase',
      'highHip',
      'mood',
      '__proto__',
    ])
    expect(Object.keys(card).sort()).toEqual(['highHip', 'hip', 'waist'])
  })
})

import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Correction, Draft, DraftOrder, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { lengthOfPath } from '../support/laws/curves'
import { fewer, holdsForOrders } from '../support/laws/hold'
import { switchedOff } from '../support/laws/law-18-corrections'
import { correctedOrder, untouched } from '../support/laws/orders'
import { attempt } from '../support/laws/redraft'

const each = engine.garments.map((garment): [string, GarmentDefinition] => [garment.id, garment])

describe('Law 18: corrections switched off leave no trace', () =>
  holdsForOrders(switchedOff, { by: 2, orders: correctedOrder }))

describe('Law 18: what a fitting corrects is drawn, or refused by its name', () => {
  it.each(each.filter(([id]) => !untouched.includes(id)))(
    '%s: most corrections of its points and seams are drawn',
    (_, garment) => {
      const orders = fc.sample(correctedOrder(garment), { numRuns: Math.max(60, fewer(2)), seed: 3 })
      const results = orders
        .filter((order) => order.corrections?.length)
        .map((order) => attempt(order, engine))
      const refused = results.filter((result) => result instanceof engine.DraftingError)
      expect(results.length).toBeGreaterThan(0)
      expect(
        refused.length / results.length,
        refused.map((one) => one.message).join('\n'),
      ).toBeLessThanOrEqual(0.1)
      for (const refusal of refused)
        expect(refusal.fields.some((field) => field.startsWith('corrections.'))).toBe(true)
    },
  )

  it.each(each)('%s: a point that cannot be moved says why', (_, garment) => {
    const order: DraftOrder = { garment: garment.id, measurements: sanityBodies.one }
    const draft = engine.draftGarment(order)
    for (const piece of draft.pieces) {
      for (const mark of piece.marks) {
        if (!mark.fixed) continue
        const result = attempt({ ...order, corrections: [moving(piece.id, mark.id, { x: 3, y: 3 })] }, engine)
        if (!(result instanceof engine.DraftingError)) throw new Error(`${piece.id}.${mark.id} was moved.`)
        expect(result.problems[0]?.field).toBe('corrections.one')
        expect(result.problems[0]?.message).toContain(mark.fixed)
      }
    }
  })
})

const moving = (piece: string, mark: string, by: { x: number; y: number }): Correction => ({
  id: 'one',
  on: { piece, mark },
  by,
})
const takingIn = (seam: string, level: number, by: number): Correction => ({
  id: 'one',
  on: { seam, level },
  by,
})
const fitOf = (draft: Draft, id: string): number => draft.fits.find((fit) => fit.id === id)?.length ?? NaN
const corrected = (garment: string, correction?: Correction, design: DraftOrder['design'] = {}): Draft =>
  engine.draftGarment({
    garment,
    measurements: sanityBodies.one,
    design,
    ...(correction ? { corrections: [correction] } : {}),
  })

describe('a skirt taken in at its side', () => {
  it.each(['straight-skirt', 'a-line-skirt'])('%s: at the waist, its waist and band follow', (id) => {
    const [plain, taken] = [corrected(id), corrected(id, takingIn('side', 0, 10))]
    expect(fitOf(plain, 'waist') - fitOf(taken, 'waist')).toBeGreaterThan(38)
    expect(fitOf(plain, 'waist') - fitOf(taken, 'waist')).toBeLessThan(42)
    expect(fitOf(taken, 'hip')).toBeCloseTo(fitOf(plain, 'hip'), 1)
    const band = (draft: Draft): number =>
      lengthOfPath(
        draft.pieces.find((piece) => piece.id === 'waistband')!.edges.find((edge) => edge.id === 'lower')!
          .path,
      )
    expect(band(plain) - band(taken)).toBeCloseTo(fitOf(plain, 'waist') - fitOf(taken, 'waist'), 3)
  })

  it.each(['straight-skirt', 'a-line-skirt', 'gathered-skirt'])(
    '%s: at the hip, by four times as much',
    (id) => {
      const level = sanityBodies.one.waistToHip
      const [plain, taken] = [corrected(id), corrected(id, takingIn('side', level, 6))]
      expect(fitOf(plain, 'hip') - fitOf(taken, 'hip')).toBeGreaterThan(23)
      expect(fitOf(plain, 'hip') - fitOf(taken, 'hip')).toBeLessThan(25)
      expect(fitOf(taken, 'waist')).toBeCloseTo(fitOf(plain, 'waist'), 1)
    },
  )

  it('a gored skirt loses at one seam what both edges of it lose, on both sides of the body', () => {
    const level = sanityBodies.one.waistToHip
    const [plain, taken] = [corrected('gored-skirt'), corrected('gored-skirt', takingIn('seam-1', level, 5))]
    expect(fitOf(plain, 'hip') - fitOf(taken, 'hip')).toBeCloseTo(20, 0)
  })

  it('a circle skirt is let out at the hip and stays as it is at the waist', () => {
    const [plain, let_] = [corrected('circle-skirt'), corrected('circle-skirt', takingIn('last', 205, -8))]
    expect(fitOf(let_, 'hip') - fitOf(plain, 'hip')).toBeCloseTo(16, 0)
    expect(fitOf(let_, 'waist')).toBeCloseTo(fitOf(plain, 'waist'), 6)
  })

  it('a level beyond its ends is refused with the levels that work', () => {
    const result = attempt(
      {
        garment: 'straight-skirt',
        measurements: sanityBodies.one,
        corrections: [takingIn('side', 900, 10)],
      },
      engine,
    )
    if (!(result instanceof engine.DraftingError)) throw new Error('It was drafted.')
    expect(result.problems[0]).toMatchObject({ field: 'corrections.one', min: 0, max: 600 })
  })

  it('more than hangs fair is refused, and says how much is not too much', () => {
    const result = attempt(
      {
        garment: 'straight-skirt',
        measurements: sanityBodies.one,
        corrections: [takingIn('side', 100, 90)],
      },
      engine,
    )
    if (!(result instanceof engine.DraftingError)) throw new Error('It was drafted.')
    expect(result.problems[0]?.message).toMatch(/no more than \d/)
  })
})

describe('a point of a skirt moved', () => {
  it('the waist lowered at the centre front changes no seam', () => {
    const lowered = corrected('straight-skirt', moving('front', 'centreWaist', { x: 0, y: 12 }))
    const front = lowered.pieces.find((piece) => piece.id === 'front')!
    expect(front.marks.find((mark) => mark.id === 'centreWaist')?.at.y).toBeCloseTo(12, 9)
    for (const seam of lowered.seams) expect(Math.abs(seam.difference)).toBeLessThan(0.5)
  })

  it('off the centre line it is refused', () => {
    const result = attempt(
      {
        garment: 'straight-skirt',
        measurements: sanityBodies.one,
        corrections: [moving('front', 'centreWaist', { x: 4, y: 0 })],
      },
      engine,
    )
    if (!(result instanceof engine.DraftingError)) throw new Error('It was drafted.')
    expect(result.problems[0]?.message).toContain('up or down only')
  })

  it('the hip of a gore moves on all gores and both edges', () => {
    const moved = corrected('gored-skirt', moving('gore-1', 'hipRight', { x: 4, y: 0 }))
    expect(fitOf(moved, 'hip') - fitOf(corrected('gored-skirt'), 'hip')).toBeCloseTo(48, 0)
  })
})

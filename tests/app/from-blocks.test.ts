import { describe, expect, it } from 'vitest'
import { fromBlocks } from '@/app/(workroom)/drafts/_parts/from-blocks'
import { draftGarment, type DraftOrder } from '@/drafting'
import { sanityBodies } from '../support/bodies'

const measurements = { ...sanityBodies.one }
const card = {
  id: 'card',
  values: Object.fromEntries(Object.entries(measurements).map(([id, mm]) => [id, { mm }])),
}
const start = (garment: string, order: Partial<DraftOrder> = {}) => ({
  order: { garment, measurements, rules: {}, unit: 'cm' as const, ...order },
  typed: { 'measurements.waist': '74 cm' },
})
const bodice: DraftOrder = {
  garment: 'bodice',
  measurements: { ...measurements, waist: 752 },
  rules: { frontNeckDepth: 'neckBase / 5 + 0.6cm + frontNeckDrop', backDart: 'suppression * 0.3' },
  remedies: [{ id: 'sloping-shoulder', amount: 6 }],
  corrections: [
    { id: 'one', on: { piece: 'back', mark: 'centreNeck' }, by: { x: 0, y: 4 }, note: 'neck lowered' },
    { id: 'two', on: { piece: 'front', mark: 'centreWaist' }, by: { x: 0, y: 5 } },
    { id: 'three', on: { piece: 'front', mark: 'underarmClosed' }, by: { x: 2, y: 0 }, off: true },
  ],
}
const block = { garment: 'bodice', cardId: 'card', order: bodice }

describe('a draft that starts from a client’s block', () => {
  it('takes everything from a block of its own garment and draws what the block draws', () => {
    const { order, carried, left } = fromBlocks(start('bodice'), [block], card)
    expect(left).toEqual([])
    expect(carried).toHaveLength(6)
    const drafted = draftGarment(order).pieces
    expect(drafted.map(({ edges }) => edges)).toEqual(draftGarment(bodice).pieces.map(({ edges }) => edges))
  })

  it('says in each step which correction came from the block', () => {
    const { order } = fromBlocks(start('bodice'), [block], card)
    const texts = draftGarment(order).steps.map(({ text }) => text)
    expect(texts).toContain('Correction: neck lowered, from the block')
  })

  it('takes to another garment what that has the points and the rules for, and says what it leaves', () => {
    const { order, carried, left } = fromBlocks(start('flared-dress'), [block], card)
    expect(carried).toContain('neck lowered')
    expect(carried).toContain('Sloping shoulder')
    expect(left).toContain('the point centreWaist on the front: not on the flared dress')
    expect(left).toContain('Back waist dart: suppression * 0.3')
    expect(order.rules).toEqual({ frontNeckDepth: 'neckBase / 5 + 0.6cm + frontNeckDrop' })
    expect(draftGarment(order).pieces.length).toBeGreaterThan(0)
  })

  it('leaves nothing of a bodice in a skirt', () => {
    const { order, carried } = fromBlocks(start('gored-skirt'), [{ ...block, cardId: 'other' }], card)
    expect(carried).toEqual([])
    expect(order).toEqual(start('gored-skirt').order)
  })

  it('lets a rule of the new draft stand', () => {
    const own = { frontNeckDepth: '8cm' }
    const { order } = fromBlocks(start('bodice', { rules: own }), [block], card)
    expect(order.rules?.frontNeckDepth).toBe('8cm')
  })

  it('takes a changed measurement along on the same card only, and forgets what had been typed', () => {
    const onSame = fromBlocks(start('bodice'), [block], card)
    expect(onSame.order.measurements.waist).toBe(752)
    expect(onSame.typed).toEqual({})
    expect(onSame.carried[0]).toBe('Waist: 75.2 cm')
    const onNewer = fromBlocks(start('bodice'), [{ ...block, cardId: 'older' }], card)
    expect(onNewer.order.measurements.waist).toBe(740)
    expect(onNewer.typed).toEqual({ 'measurements.waist': '74 cm' })
  })

  it('takes from bodice and skirt together, and from the same garment alone when there is one', () => {
    const skirt = {
      garment: 'straight-skirt',
      cardId: 'card',
      order: {
        garment: 'straight-skirt',
        measurements,
        corrections: [{ id: 'one', on: { piece: 'back', mark: 'centreWaist' }, by: { x: 0, y: 6 } }],
      },
    }
    expect(fromBlocks(start('a-line-skirt'), [block, skirt], card).order.corrections).toHaveLength(1)
    expect(fromBlocks(start('bodice'), [skirt, block], card).order.corrections).toHaveLength(2)
  })

  it('starts plain without a block', () => {
    expect(fromBlocks(start('bodice'), [], card)).toEqual({ ...start('bodice'), carried: [], left: [] })
  })
})

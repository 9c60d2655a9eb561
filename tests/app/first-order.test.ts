import { describe, expect, it } from 'vitest'
import { firstOrder } from '@/app/(workroom)/drafts/_parts/first-order'
import { publishedSize, publishedSizes } from '@/app/(workroom)/drafts/_parts/published-sizes'
import { usualAllowances } from '@/db/shapes/workroom'
import { draftGarment, garments } from '@/drafting'

const dress = garments.find((garment) => garment.id === 'flared-dress')!
const bust = { mm: 927.1, typed: '36 1/2', unit: 'in' } as const

describe('the order a draft starts from', () => {
  it('keeps every measurement of the card and what was typed, with its unit', () => {
    const { order, typed } = firstOrder(
      dress,
      { unit: 'in', values: { bust } },
      { allowances: usualAllowances },
    )
    expect(order.measurements).toEqual({ bust: 927.1 })
    expect(order.unit).toBe('in')
    expect(typed['measurements.bust']).toBe('36 1/2 in')
  })

  it('takes the allowances of the workroom where they differ from the garment’s', () => {
    const allowances = { ...usualAllowances, side: { mm: 20, typed: '2', unit: 'cm' } as const }
    const { order, typed } = firstOrder(dress, { unit: 'cm', values: { bust } }, { allowances })
    expect(order.design?.sideAllowance).toBe(20)
    expect(typed['design.sideAllowance']).toBe('2 cm')
  })

  it('leaves an allowance alone that the garment would refuse', () => {
    const allowances = { ...usualAllowances, neckline: { mm: 150, typed: '15', unit: 'cm' } as const }
    expect(
      firstOrder(dress, { unit: 'cm', values: { bust } }, { allowances }).order.design,
    ).not.toHaveProperty('neckAllowance')
  })

  it('copies the rules of the method for the garment, with its version', () => {
    const rules = [{ id: 'armholeDepth', formula: 'bust / 8 + 9cm', source: 'our school' }]
    const method = {
      id: 'ours',
      name: 'Our school',
      description: '',
      version: 4,
      garments: { 'flared-dress': rules, bodice: [] },
    }
    const { order } = firstOrder(
      dress,
      { unit: 'in', values: { bust } },
      { allowances: usualAllowances, method },
    )
    expect(order.method).toEqual({ id: 'ours', name: 'Our school', version: 4, rules })
  })

  it('brings along what the workroom’s own measurements on the card are', () => {
    const own = ['back_arc', 'front_arc'].map((id) => ({ id, name: id, how: 'Round.', min: 200, max: 600 }))
    const values = { bust, back_arc: { mm: 460, typed: '46', unit: 'cm' } as const }
    const { order, typed } = firstOrder(dress, { unit: 'cm', values }, { allowances: usualAllowances, own })
    expect(order.ownMeasurements).toEqual([own[0]])
    expect(order.measurements.back_arc).toBe(460)
    expect(typed['measurements.back_arc']).toBe('46 cm')
  })

  it('drafts on every published size that is offered', () => {
    const offered = publishedSizes().flatMap((table) => table.sizes)
    expect(offered.length).toBeGreaterThan(5)
    for (const size of offered) {
      const body = { unit: 'cm', values: publishedSize(size.id) } as const
      const { order, typed } = firstOrder(dress, body, { allowances: usualAllowances })
      expect(Object.keys(typed).filter((field) => field.startsWith('measurements.'))).toEqual([])
      expect(draftGarment(order).pieces.map((piece) => piece.id)).toContain('front')
    }
  })

  it('refuses a size that is in no table', () => {
    expect(() => publishedSize('no-such-size')).toThrow('Choose a size from the list.')
  })
})

import { describe, expect, it } from 'vitest'
import { checkMethodRules, draftGarment, garments, methods, rulesInForce, type DraftOrder } from '@/drafting'
import { sanityBodies } from '../../support/bodies'

const order: DraftOrder = { garment: 'flared-dress', measurements: sanityBodies.one, unit: 'in' }

function refusal(of: DraftOrder) {
  try {
    draftGarment(of)
  } catch (error) {
    return error as { readonly problems: readonly { field: string; code: string; message: string }[] }
  }
  throw new Error('It was drafted.')
}

describe('drafting methods', () => {
  it('are two at least, and what they name exists and can be worked out', () => {
    expect(methods.map(({ id }) => id)).toEqual(['freehand', 'handbook'])
    for (const method of methods) expect(checkMethodRules(method.garments)).toEqual([])
  })

  it('say for every rule where it comes from', () => {
    for (const { id } of methods)
      for (const { id: garment } of garments)
        for (const rule of rulesInForce({ garment, method: { id } }))
          expect(rule.source.length).toBeGreaterThan(5)
  })

  it('draft by the garment’s own rules when freehand, to the byte', () => {
    expect(draftGarment({ ...order, method: { id: 'freehand' } })).toEqual(draftGarment(order))
  })

  it('change the pattern, and the sums show the method’s formula', () => {
    const drafted = draftGarment({ ...order, method: { id: 'handbook' } })
    expect(drafted.pieces).not.toEqual(draftGarment(order).pieces)
    const depth = drafted.steps.find((one) => one.rule === 'armholeDepth')
    expect(depth?.formula).toBe('bust / 8 + 2 1/2 in')
    expect(depth?.arithmetic).toMatch(/ ÷ 8 \+ 2 1\/2 ≈ /)
  })

  it('give way to a rule that was changed for this draft alone', () => {
    const rules = { armholeDepth: 'bust / 4 - 1cm' }
    const found = rulesInForce({ garment: 'flared-dress', method: { id: 'handbook' }, rules })
    expect(found.find(({ id }) => id === 'armholeDepth')).toMatchObject({
      from: 'order',
      formula: 'bust / 4 - 1cm',
    })
    expect(found.find(({ id }) => id === 'frontNeckDepth')).toMatchObject({ from: 'method' })
    expect(found.find(({ id }) => id === 'hipLevel')).toMatchObject({ from: 'garment' })
  })

  it('stand in the order itself when they are a workroom’s own: what is built in does not matter then', () => {
    const rules = [{ id: 'armholeDepth', formula: '21cm', source: 'our school' }]
    const drafted = draftGarment({ ...order, method: { id: 'handbook', name: 'Ours', version: 3, rules } })
    expect(drafted.steps.filter((one) => one.rule === 'armholeDepth').map((one) => one.formula)).toContain(
      '21cm',
    )
    expect(
      drafted.steps.filter((one) => one.rule === 'frontNeckDepth').map((one) => one.formula),
    ).not.toContain('neckBase / 5 + 1/4 in + frontNeckDrop')
  })

  it.each([
    ['a method nobody knows', { id: 'nobody' }, 'method'],
    ['a method that is no method', 'handbook', 'method'],
    ['rules that are no list', { id: 'ours', rules: { armholeDepth: '20cm' } }, 'method.rules'],
    [
      'a rule of another garment',
      { id: 'ours', rules: [{ id: 'radius', formula: '1cm', source: '' }] },
      'method.rules.radius',
    ],
    [
      'a formula that is none',
      { id: 'ours', rules: [{ id: 'armholeDepth', formula: 'bust +', source: '' }] },
      'armholeDepth',
    ],
  ])('refuse %s at its field', (_, method, field) => {
    const { problems } = refusal({ ...order, method: method as never })
    expect(problems.map((problem) => problem.field)).toEqual([field])
    expect(problems[0]?.message.length).toBeGreaterThan(20)
  })

  it('are checked rule by rule before they are kept', () => {
    const wrong = checkMethodRules({
      'flared-dress': [
        { id: 'armholeDepth', formula: 'bust / 6 + 4', source: '' },
        { id: 'neckWidth', formula: 'frontNeckDepth / 2', source: '' },
        { id: 'frontNeckDepth', formula: 'neckWidth * 2', source: '' },
      ],
      bodice: [{ id: 'armholeDepth', formula: '20cm', source: '' }],
      cloak: [{ id: 'armholeDepth', formula: '20cm', source: '' }],
    })
    const fields = wrong.map(({ field }) => field)
    expect(fields).toContain('garments.flared-dress.armholeDepth')
    expect(fields).toContain('garments.bodice.armholeDepth')
    expect(fields).toContain('garments.cloak')
    expect(wrong.find(({ field }) => field.endsWith('dress.armholeDepth'))?.position).toBe(9)
  })

  it('name every rule of a circle', () => {
    const [circle] = checkMethodRules({
      'flared-dress': [
        { id: 'neckWidth', formula: 'frontNeckDepth / 2', source: '' },
        { id: 'frontNeckDepth', formula: 'neckWidth * 2', source: '' },
      ],
    })
    expect(circle?.message).toContain('neckWidth → frontNeckDepth → neckWidth')
  })
})

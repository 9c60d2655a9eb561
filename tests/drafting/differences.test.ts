import { describe, expect, it } from 'vitest'
import { draftGarment } from '@/drafting'
import { differences } from '@/drafting/compare/differences'
import { sanityBodies } from '../support/bodies'

const body = sanityBodies.one
const dress = (design = {}) => draftGarment({ garment: 'flared-dress', measurements: body, design })

describe('two drawings of one order', () => {
  it('that are alike differ nowhere', () => {
    expect(differences(dress(), dress())).toEqual([])
  })

  it('that went through a file differ nowhere', () => {
    expect(differences(JSON.parse(JSON.stringify(dress())), dress())).toEqual([])
  })

  it('differ where a line moved, by as much as it moved, the worst first', () => {
    const found = differences(dress(), dress({ frontNeckDrop: 12 }))
    expect(found.length).toBeGreaterThan(0)
    expect(found.every(({ piece }) => /Front|facing/i.test(piece))).toBe(true)
    const stitched = found.find(
      ({ piece, where }) => piece === 'Front' && where === 'neckline, stitching line',
    )
    const before = differences(dress(), dress({ frontNeckDrop: 6 })).find(
      ({ piece, where }) => piece === 'Front' && where === 'neckline, stitching line',
    )
    expect((stitched?.by ?? 0) / (before?.by ?? 1)).toBeCloseTo(2, 1)
    const amounts = found.map(({ by }) => by ?? Infinity)
    expect([...amounts].sort((a, b) => b - a)).toEqual(amounts)
  })

  it('differ as a whole where one has a piece that the other lacks', () => {
    const found = differences(dress({ sleeve: 'none' }), dress({ sleeve: 'plain' }))
    expect(found).toContainEqual({ piece: 'Sleeve', where: 'the whole piece', by: null })
    expect(found[0]?.by).toBeNull()
  })

  it('a hundredth of a millimetre is no difference', () => {
    expect(differences(dress(), dress({ frontNeckDrop: 0.009 }))).toEqual([])
    expect(differences(dress(), dress({ frontNeckDrop: 0.05 }))).not.toEqual([])
  })
})

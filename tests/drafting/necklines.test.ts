import { describe, expect, it } from 'vitest'
import { draftGarment, garments, pathLength, type Draft, type DraftOrder } from '@/drafting/index'
import { sanityBodies } from '../support/bodies'

const draft = (
  garment: string,
  design: DraftOrder['design'],
  body: DraftOrder['measurements'] = sanityBodies.one,
) => draftGarment({ garment, measurements: body, design })
const piece = (of: Draft, id: string) => of.pieces.find((one) => one.id === id)!
const long = (of: Draft, id: string, edge: string): number =>
  pathLength(piece(of, id).edges.find((one) => one.id === edge)!.path)
const codes = (of: Draft): string[] => of.cautions.map((caution) => caution.code)
const neckOf = (of: Draft): number => 2 * (long(of, 'front', 'neckline') + long(of, 'back', 'neckline'))

describe.each(['flared-dress', 'bodice'])('Necklines of a %s', (garment) => {
  const shapes = garments
    .find((one) => one.id === garment)!
    .design.find((one) => one.id === 'neckShape')!.choices!

  it('are the eight of the table', () => {
    expect(shapes.toSorted()).toEqual(
      ['V', 'boat', 'high', 'keyhole', 'round', 'scoop', 'square', 'sweetheart'].toSorted(),
    )
  })

  it.each(shapes)('%s: both shoulders and both facings meet along their whole length', (neckShape) => {
    for (const body of [sanityBodies.one, sanityBodies.two]) {
      const drawn = draft(garment, { neckShape }, body)
      for (const side of ['front', 'back']) {
        expect(long(drawn, `${side}-neck-facing`, 'neckline')).toBeCloseTo(long(drawn, side, 'neckline'))
        expect(piece(drawn, `${side}-neck-facing`).cut.map((cut) => cut.cloth)).toEqual([
          'main',
          'interfacing',
        ])
      }
    }
  })

  it('says to understitch the facing', () => {
    const step = draft(garment, {}).steps.find((one) => one.id === 'front-neck-facing.neckline')!
    expect(step.text).toContain('understitch')
  })

  it('V is deeper than round by about 5.8 cm and pointed', () => {
    const depth = (neckShape: string): number =>
      piece(draft(garment, { neckShape }), 'front').marks.find((mark) => mark.id === 'centreNeck')!.at.y
    expect(depth('V') - depth('round')).toBeCloseTo(58)
  })
})

describe('A keyhole neckline', () => {
  it('is round with a drop at the centre front, which its facing covers', () => {
    const drawn = draft('flared-dress', { neckShape: 'keyhole', frontKeyhole: 120 })
    for (const id of ['front', 'front-neck-facing']) {
      const drop = piece(drawn, id).lines.find((line) => line.id === 'keyhole')!
      expect(drop.path.segments.at(-1)!.to.y - drop.path.segments[0]!.from.y).toBeCloseTo(120)
    }
    const bottom = piece(drawn, 'front-neck-facing').marks.find((mark) => mark.id === 'centreEdge')!
    const end = piece(drawn, 'front').marks.find((mark) => mark.id === 'keyholeEnd')!
    expect(bottom.at.y).toBeGreaterThan(end.at.y + 30)
  })

  it('lets the head through by itself when it is deep enough', () => {
    expect(
      codes(draft('flared-dress', { neckShape: 'keyhole', backOpening: 'none', frontKeyhole: 200 })),
    ).not.toContain('slit-added')
    expect(codes(draft('flared-dress', { neckShape: 'round', backOpening: 'none' }))).toContain('slit-added')
  })

  it('is left out of a front that buttons from top to bottom, and says so', () => {
    const drawn = draft('flared-dress', { neckShape: 'keyhole', backOpening: 'button band' })
    expect(piece(drawn, 'front').lines.some((line) => line.id === 'keyhole')).toBe(false)
    expect(codes(drawn)).toContain('keyhole-left-out')
  })
})

describe('A high neckline', () => {
  it('carries a funnel as long as the neck, on the fold in front where there is a zip behind', () => {
    const drawn = draft('bodice', { neckShape: 'high', funnelHeight: 70 })
    expect(2 * long(drawn, 'funnel', 'neck')).toBeCloseTo(neckOf(drawn))
    expect(long(drawn, 'funnel', 'centre-back')).toBeCloseTo(70)
    expect(piece(drawn, 'funnel').cut[0]).toEqual({ cloth: 'main', count: 2, onFold: true, handed: false })
  })

  it('always opens: without a zip the centre back is slit', () => {
    const wide = { neckShape: 'high', backOpening: 'none', neckWidening: 70, frontNeckDrop: 100 }
    expect(codes(draft('flared-dress', wide))).toContain('slit-added')
    expect(codes(draft('flared-dress', { ...wide, neckShape: 'round' }))).not.toContain('slit-added')
  })
})

describe('A neck opened wider than the shoulder is long', () => {
  it.each(['flared-dress', 'bodice'])('keeps 2.5 cm of the shoulder of a %s, and says so', (garment) => {
    const narrow = { ...sanityBodies.one, acrossShoulders: 330, shoulderLength: 100 }
    const drawn = draft(garment, { neckShape: 'boat', neckWidening: 60 }, narrow)
    expect(codes(drawn)).toContain('neck-narrowed')
    expect(long(drawn, 'front', 'shoulder')).toBeCloseTo(25)
  })
})

import { describe, expect, it } from 'vitest'
import type { Correction, Draft, DraftOrder } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { far, lengthOfPath } from '../support/laws/curves'

const bodice = (more: Partial<DraftOrder> = {}): Draft =>
  engine.draftGarment({ garment: 'bodice', measurements: sanityBodies.one, ...more })
const corrected = (correction: Omit<Correction, 'id'>, design: DraftOrder['design'] = {}): Draft =>
  bodice({ design, corrections: [{ id: 'fitting', ...correction }] })
const pieceOf = (draft: Draft, id: string) => {
  const piece = draft.pieces.find((one) => one.id === id)
  if (!piece) throw new Error(`No piece “${id}”.`)
  return piece
}
const at = (draft: Draft, piece: string, mark: string) => {
  const found = pieceOf(draft, piece).marks.find(({ id }) => id === mark)
  if (!found) throw new Error(`No mark “${mark}” on the ${piece}.`)
  return found.at
}
const long = (draft: Draft, piece: string, edge: string): number =>
  pieceOf(draft, piece)
    .edges.filter(({ id }) => id === edge || id === `${edge}-beyond`)
    .reduce((sum, one) => sum + lengthOfPath(one.path), 0)
const waist = (draft: Draft): number => draft.fits.find(({ id }) => id === 'waist')?.length ?? NaN
const worst = (draft: Draft): number => Math.max(...draft.seams.map((seam) => Math.abs(seam.difference)))

describe('corrections of a bodice', () => {
  it('a shoulder tip moved on the front moves on the back, and the shoulder still closes', () => {
    const before = bodice()
    const after = corrected({ on: { piece: 'front', mark: 'shoulderTip' }, by: { x: 4, y: 6 } })
    expect(far(at(after, 'front', 'shoulderTip'), at(before, 'front', 'shoulderTip'))).toBeCloseTo(
      Math.hypot(4, 6),
      6,
    )
    expect(far(at(after, 'back', 'shoulderTip'), at(before, 'back', 'shoulderTip'))).toBeGreaterThan(5)
    expect(worst(after)).toBeLessThanOrEqual(0.5)
  })

  it('a side seam taken in at the waist is taken in on both sides, and the waist with it', () => {
    const before = bodice()
    const level = at(before, 'back', 'sideWaist').y
    const after = corrected({ on: { seam: 'side', level }, by: 8 })
    expect(waist(before) - waist(after)).toBeGreaterThan(30)
    expect(waist(before) - waist(after)).toBeLessThan(34)
    expect(long(after, 'front', 'side')).toBeCloseTo(long(after, 'back', 'side'), 6)
    expect(worst(after)).toBeLessThanOrEqual(0.5)
    const cutAt = (draft: Draft): number =>
      Math.max(
        ...pieceOf(draft, 'back')
          .cutLine.segments.map(({ to }) => to)
          .filter(({ y }) => y > level - 5)
          .map(({ x }) => x),
      )
    expect(cutAt(before) - cutAt(after)).toBeGreaterThan(6)
  })

  it('a neck dropped takes its facing along', () => {
    const after = corrected({ on: { piece: 'front', mark: 'centreNeck' }, by: { x: 0, y: 15 } })
    const before = bodice()
    expect(at(after, 'front', 'centreNeck').y - at(before, 'front', 'centreNeck').y).toBeCloseTo(15, 9)
    expect(long(after, 'front-neck-facing', 'neckline')).toBeCloseTo(long(after, 'front', 'neckline'), 6)
    expect(long(after, 'front', 'neckline')).toBeGreaterThan(long(before, 'front', 'neckline') + 8)
  })

  it('a dart point moved keeps both legs of its dart alike', () => {
    const after = corrected({ on: { piece: 'front', mark: 'bustDartPoint' }, by: { x: -6, y: 4 } })
    const dart = pieceOf(after, 'front').darts.find(({ id }) => id === 'bust-dart')
    const [first, second] = (dart?.legs ?? []).map(lengthOfPath)
    expect(first).toBeCloseTo(second ?? NaN, 6)
  })

  it('on a tape every seam still agrees within half a mark', () => {
    const taped = bodice({ tape: 3.175, unit: 'in', design: { dartTo: 'shoulder', sleeve: 'plain' } })
    expect(worst(taped)).toBeLessThanOrEqual(3.175 / 2)
  })

  it('a point to drag moves the value that it stands for', () => {
    const moves = engine
      .handles({ garment: 'bodice', measurements: sanityBodies.one })
      .find(({ id }) => id === 'front.centreNeck')?.moves
    expect(moves?.map(({ value }) => value)).toEqual(['frontNeckDrop'])
    expect(moves?.[0]?.perMm).toBeCloseTo(1, 3)
  })
})

describe('princess seams', () => {
  it.each(['princess from the shoulder', 'princess from the armhole'])(
    '%s: both sides are alike above and below the bust, and pass near it',
    (shaping) => {
      for (const measurements of [sanityBodies.one, sanityBodies.two]) {
        const draft = bodice({ measurements, design: { shaping } })
        const seam = draft.seams.find(({ id }) => id === 'front-princess')
        expect(seam?.smooth).toBe(true)
        expect(Math.abs(seam?.difference ?? NaN)).toBeLessThanOrEqual(0.01)
        expect(seam?.matches).toHaveLength(3)
        const match = seam?.matches[1]
        expect(Math.abs((match?.a ?? NaN) - (match?.b ?? NaN))).toBeLessThanOrEqual(0.01)
        const apex = at(draft, 'front', 'bustPoint')
        const princess = pieceOf(draft, 'front').edges.find(({ id }) => id === 'princess')
        const nearest = Math.min(...(princess?.path.segments ?? []).map(({ to }) => far(to, apex)))
        expect(nearest).toBeLessThanOrEqual(15)
      }
    },
  )
})

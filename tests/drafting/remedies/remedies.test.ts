import { describe, expect, it } from 'vitest'
import {
  draftGarment,
  DraftingError,
  handles,
  pathLength,
  remedies,
  remedyMoves,
  withRemedies,
  type DraftOrder,
} from '@/drafting'
import { sanityBodies } from '../../support/bodies'

const bodice: DraftOrder = { garment: 'bodice', measurements: sanityBodies.one }
const mended = (id: string, amount: number, order = bodice): DraftOrder => ({
  ...order,
  remedies: [{ id, amount }],
})

function problemsOf(order: unknown) {
  try {
    draftGarment(order as DraftOrder)
  } catch (error) {
    if (error instanceof DraftingError) return error.problems
    throw error
  }
  throw new Error('It was drafted.')
}

function at(order: DraftOrder, piece: string, mark: string) {
  const found = draftGarment(order)
    .pieces.find(({ id }) => id === piece)
    ?.marks.find(({ id }) => id === mark)
  if (!found) throw new Error(`No ${mark} on the ${piece}`)
  return found.at
}

function moveOf(order: DraftOrder, piece: string, mark: string) {
  return remedyMoves(order).find((move) => move.piece === piece && move.mark === mark)
}

describe('named fit remedies', () => {
  it('are the six usual ones, each with how to see it, a source and a garment it is offered for', () => {
    expect(remedies.map(({ id }) => id)).toEqual([
      'full-bust',
      'round-back',
      'sway-back',
      'forward-shoulder',
      'sloping-shoulder',
      'large-arm',
    ])
    for (const { see, does, source, garments, min, max, ...remedy } of remedies) {
      for (const words of [see, does, source]) expect(words.length).toBeGreaterThan(15)
      expect(garments.length).toBeGreaterThan(0)
      expect(min <= remedy.default && remedy.default <= max).toBe(true)
    }
  })

  it('say what they move, farthest first, as it is drawn', () => {
    for (const { id, max, garments } of remedies) {
      for (const garment of garments) {
        const order = mended(id, max, {
          ...bodice,
          garment,
          ...(id === 'large-arm' ? { design: { sleeve: 'plain' } } : {}),
        })
        const moves = remedyMoves(order)
        expect(moves.length).toBeGreaterThan(0)
        expect(moves.map(({ distance }) => distance)).toEqual(
          moves.map(({ distance }) => distance).toSorted((a, b) => b - a),
        )
        for (const { piece, mark, by } of moves.slice(0, 3)) {
          const [now, before] = [at(order, piece, mark), at({ ...order, remedies: [] }, piece, mark)]
          expect(now.x - before.x).toBeCloseTo(by.x, 9)
          expect(now.y - before.y).toBeCloseTo(by.y, 9)
        }
      }
    }
  })

  it('full bust: what the front gains the back gives, and the bust dart opens wider', () => {
    const order = mended('full-bust', 10)
    expect(moveOf(order, 'front', 'underarmClosed')?.by.x).toBeCloseTo(10, 6)
    expect(moveOf(order, 'back', 'underarm')?.by.x).toBeCloseTo(-10, 6)
    const intake = (of: DraftOrder) =>
      draftGarment(of).pieces[0]?.darts.find(({ id }) => id === 'bust-dart')?.intake ?? NaN
    expect(intake(order)).toBeGreaterThan(intake(bodice) + 3)
  })

  it('round back: the back grows between nape and underarm and its shoulder is eased more', () => {
    const order = mended('round-back', 10)
    expect(moveOf(order, 'back', 'underarm')?.by.y).toBeCloseTo(10, 6)
    const ease = (of: DraftOrder) => draftGarment(of).seams.find(({ id }) => id === 'shoulder')?.ease
    expect(ease(order)).toBeCloseTo((ease(bodice) ?? 0) + 4, 6)
  })

  it('sway back: the centre comes up in a bodice and down in a skirt, the side stays at its level', () => {
    expect(moveOf(mended('sway-back', 12), 'back', 'centreWaist')?.by).toEqual({ x: 0, y: -12 })
    expect(moveOf(mended('sway-back', 12), 'back', 'sideWaist')?.by.y ?? 0).toBeCloseTo(0, 6)
    const skirt = { ...bodice, garment: 'straight-skirt' }
    expect(moveOf(mended('sway-back', 12, skirt), 'back', 'centreWaist')?.by.y).toBeCloseTo(12, 6)
  })

  it('forward shoulder: the tips turn about the side neck, front down and back up, and stay as long', () => {
    const order = mended('forward-shoulder', 6)
    expect(moveOf(order, 'front', 'shoulderTip')?.by.y).toBeGreaterThan(5)
    expect(moveOf(order, 'back', 'shoulderTip')?.by.y).toBeLessThan(-5)
    const long = (of: DraftOrder) =>
      pathLength(draftGarment(of).pieces[0]!.edges.find(({ id }) => id === 'shoulder')!.path)
    expect(long(order)).toBeCloseTo(long(bodice), 6)
  })

  it('sloping shoulder: tips and underarm come down together', () => {
    const dress = mended('sloping-shoulder', 8, { ...bodice, garment: 'flared-dress' })
    for (const piece of ['front', 'back'])
      for (const mark of ['shoulderTip', 'underarm'])
        expect(moveOf(dress, piece, mark)?.by.y).toBeCloseTo(8, 6)
  })

  it('large arm: the sleeve is that much wider, its head still fits the armhole', () => {
    const order = mended('large-arm', 20, { ...bodice, design: { sleeve: 'plain' } })
    const girth = (of: DraftOrder) => draftGarment(of).fits.find(({ id }) => id === 'biceps')?.length ?? NaN
    expect(girth(order) - girth({ ...order, remedies: [] })).toBeCloseTo(20, 1)
    for (const seam of draftGarment(order).seams) expect(Math.abs(seam.difference)).toBeLessThan(0.5)
  })

  it('stand in the sums of the steps', () => {
    const step = draftGarment(mended('full-bust', 10)).steps.find(({ rule }) => rule === 'frontQuarter')
    expect(step?.formula).toBe('((bust + bustEase) / 4 + 0.5cm) + 10 mm')
    expect(step?.arithmetic).toMatch(/\+ 1 (?:=|≈)/)
  })

  it('switched off leave the draft as it was, to the byte', () => {
    const off = { ...bodice, remedies: remedies.map(({ id, min }) => ({ id, amount: min, off: true })) }
    const offered = off.remedies.filter(({ id }) =>
      remedies.find((one) => one.id === id)?.garments.includes('bodice'),
    )
    expect(JSON.stringify(draftGarment({ ...off, remedies: offered }))).toBe(
      JSON.stringify(draftGarment(bodice)),
    )
  })

  it('go together, beneath the corrections and on top of a method', () => {
    const order: DraftOrder = {
      ...bodice,
      method: { id: 'handbook' },
      remedies: [
        { id: 'round-back', amount: 5 },
        { id: 'sloping-shoulder', amount: 5 },
        { id: 'sway-back', amount: 10 },
      ],
      corrections: [{ id: 'more', on: { piece: 'back', mark: 'centreWaist' }, by: { x: 0, y: -3 } }],
    }
    const plain = withRemedies(order)
    expect(plain.remedies).toBeUndefined()
    expect(draftGarment(plain)).toEqual(draftGarment(order))
    const bare = { ...bodice, method: { id: 'handbook' } }
    expect(at(order, 'back', 'centreWaist').y - at(bare, 'back', 'centreWaist').y).toBeCloseTo(-13, 6)
    expect(at(order, 'back', 'scyeLevel').y - at(bare, 'back', 'scyeLevel').y).toBeCloseTo(10, 6)
  })

  it('are there while a point is dragged', () => {
    const tip = (order: DraftOrder) => handles(order).find(({ id }) => id === 'front.shoulderTip')?.at
    expect(tip(mended('forward-shoulder', 8))).not.toEqual(tip(bodice))
  })

  it.each([
    ['one that nobody knows', [{ id: 'long-nose', amount: 5 }], 'remedies.0'],
    ['one for another garment', [{ id: 'sway-back', amount: 5 }], 'remedies.sway-back', 'flared-dress'],
    ['too much', [{ id: 'round-back', amount: 90 }], 'remedies.round-back'],
    ['no number', [{ id: 'round-back', amount: '8' }], 'remedies.round-back'],
    ['not a number', [{ id: 'round-back', amount: NaN }], 'remedies.round-back'],
    [
      'the same twice',
      [
        { id: 'round-back', amount: 5 },
        { id: 'round-back', amount: 5 },
      ],
      'remedies.round-back',
    ],
    ['a sleeve that is not there', [{ id: 'large-arm', amount: 20 }], 'remedies.large-arm'],
    ['no list', { id: 'round-back', amount: 5 }, 'remedies'],
    ['nothing in the list', [null], 'remedies.0'],
  ])('are refused with %s, at their field', (_, given, field, garment = 'bodice') => {
    const problems = problemsOf({ ...bodice, garment, remedies: given })
    expect(problems.map((problem) => problem.field)).toEqual([field])
    expect(problems[0]?.message.length).toBeGreaterThan(20)
  })

  it('say so when a style is already at its end', () => {
    const steep = { ...mended('sloping-shoulder', 15), design: { backSlope: 26 } }
    expect(problemsOf(steep).map(({ field }) => field)).toEqual(['remedies.sloping-shoulder'])
  })
})

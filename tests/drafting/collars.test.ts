import { describe, expect, it } from 'vitest'
import { draftGarment, pathLength, type Draft, type DraftOrder } from '@/drafting/index'
import { sanityBodies } from '../support/bodies'

const dress = (design: DraftOrder['design'], body: DraftOrder['measurements'] = sanityBodies.one): Draft =>
  draftGarment({ garment: 'flared-dress', measurements: body, design })

const piece = (draft: Draft, id: string) => draft.pieces.find((one) => one.id === id)!
const long = (draft: Draft, id: string, edge: string): number =>
  pathLength(piece(draft, id).edges.find((one) => one.id === edge)!.path)
const cutOf = (draft: Draft, id: string) =>
  piece(draft, id).cut.map(({ cloth, count, onFold }) => [cloth, count, onFold])

describe.each(['Peter Pan', 'mandarin', 'shirt'])('A %s collar', (collar) => {
  const neckPiece = collar === 'shirt' ? 'collar-stand' : 'collar'

  it.each(['one', 'two'] as const)(
    'is as long as the neckline, with a notch for the shoulder, on body %s',
    (body) => {
      const draft = dress({ collar }, sanityBodies[body])
      const front = long(draft, 'front', 'neckline')
      expect(long(draft, neckPiece, 'neck')).toBeCloseTo(front + long(draft, 'back', 'neckline'))
      const notches = piece(draft, neckPiece).notches.filter((notch) => notch.edge === 'neck')
      expect(notches.map((notch) => notch.at)).toEqual([expect.closeTo(front)])
    },
  )

  it('lies between the garment and its facing: one layer is sewn to each', () => {
    const draft = dress({ collar })
    for (const [seam, other] of [
      ['front-collar', 'front'],
      ['front-facing-collar', 'front-neck-facing'],
      ['back-collar', 'back'],
      ['back-facing-collar', 'back-neck-facing'],
    ]) {
      const found = draft.seams.find((one) => one.id === seam)!
      expect(found.a.map((run) => run.piece)).toEqual([other])
      expect(found.b.map((run) => run.piece)).toEqual([neckPiece])
    }
    expect(draft.seams.some((seam) => seam.id === 'front-neckline-facing')).toBe(false)
  })

  it('is not drawn on a neckline that takes none', () => {
    const ids = dress({ collar, neckShape: 'V' }).pieces.map((one) => one.id)
    expect(ids).not.toContain(neckPiece)
  })
})

describe('What is cut of a collar follows where the garment opens', () => {
  it('on the fold behind when it buttons in front', () => {
    const draft = dress({ collar: 'Peter Pan', backOpening: 'button band' })
    expect(cutOf(draft, 'collar')).toEqual([
      ['main', 2, true],
      ['interfacing', 1, true],
    ])
  })

  it('in two halves when there is a zip behind, a stand on the fold in front', () => {
    expect(cutOf(dress({ collar: 'Peter Pan' }), 'collar')).toEqual([
      ['main', 4, false],
      ['interfacing', 2, false],
    ])
    const stand = dress({ collar: 'mandarin' })
    expect(piece(stand, 'collar').edges.find((edge) => edge.role === 'fold')!.id).toBe('centre-front')
  })

  it('a stand that opens nowhere is closed with a seam behind', () => {
    const draft = dress({ collar: 'mandarin', backOpening: 'none', neckWidening: 60, frontNeckDrop: 100 })
    expect(draft.seams.map((seam) => seam.id)).toContain('collar-centre-back')
  })
})

describe('The stand', () => {
  it('is shorter above than below, by height × the angle it bends', () => {
    const draft = dress({ collar: 'mandarin', standHeight: 40, standRise: 15 })
    const half = long(draft, 'collar', 'neck')
    // Half the neck × shortening / (2 × height) = rise, from memory of the trade; true for a small rise.
    const shorter = half - long(draft, 'collar', 'top')
    expect((half * shorter) / (2 * 40)).toBeGreaterThan(15 * 0.98)
    expect((half * shorter) / (2 * 40)).toBeLessThan(15 * 1.02)
  })

  it('of a shirt runs on over the lap and carries a collar as long as its top', () => {
    const draft = dress({ collar: 'shirt', backOpening: 'button band' })
    const neck = long(draft, 'front', 'neckline') + long(draft, 'back', 'neckline')
    expect(long(draft, 'collar-stand', 'neck') - neck).toBeCloseTo(long(draft, 'front', 'overlap-neck'))
    expect(long(draft, 'collar', 'neck')).toBeCloseTo(long(draft, 'collar-stand', 'top'))
    expect(piece(draft, 'collar-stand').notches.filter((notch) => notch.edge === 'neck')).toHaveLength(2)
  })
})

describe('The Peter Pan collar', () => {
  it('rolls more the further the shoulders are overlapped: its outer edge gets shorter', () => {
    const edges = [10, 20, 40].map((collarOverlap) =>
      long(dress({ collar: 'Peter Pan', collarOverlap }), 'collar', 'outer'),
    )
    expect(edges[1]).toBeLessThan(edges[0]! - 3)
    expect(edges[2]).toBeLessThan(edges[1]! - 5)
  })

  it('says so when the shoulder is too short for the overlap', () => {
    const narrow = { ...sanityBodies.one, acrossShoulders: 345 }
    const wide = dress({ collar: 'Peter Pan', collarOverlap: 45, neckWidening: 70 }, narrow)
    expect(wide.cautions.map((caution) => caution.code)).toContain('collar-overlap-lessened')
  })

  it('is as wide as asked at the centre back', () => {
    const draft = dress({ collar: 'Peter Pan', collarWidth: 72 })
    expect(long(draft, 'collar', 'centre-back')).toBeCloseTo(72)
  })
})

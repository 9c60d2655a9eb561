import { describe, expect, it } from 'vitest'
import { draftGarment, pathLength, type Draft, type DraftOrder } from '@/drafting/index'
import { sanityBodies } from '../support/bodies'

const dress = (design: DraftOrder['design'], body: DraftOrder['measurements'] = sanityBodies.one): Draft =>
  draftGarment({ garment: 'flared-dress', measurements: body, design })

const piece = (draft: Draft, id: string) => draft.pieces.find((one) => one.id === id)!
const edgeIds = (draft: Draft, id: string): string[] => piece(draft, id).edges.map((edge) => edge.id)

describe('A dress that buttons in front', () => {
  const draft = dress({ backOpening: 'button band' })
  const front = piece(draft, 'front')

  it('is cut as a left and a right front, with the back on the fold', () => {
    expect(front.cut).toEqual([{ cloth: 'main', count: 2, onFold: false, handed: true }])
    expect(piece(draft, 'back').cut).toEqual([{ cloth: 'main', count: 1, onFold: true, handed: false }])
    expect(edgeIds(draft, 'front')).not.toContain('centre')
    expect(edgeIds(draft, 'back')).toContain('centre')
  })

  it('laps over by half a button and 6 mm', () => {
    const opening = front.edges.find((edge) => edge.id === 'opening')!
    expect(opening.path.segments[0]!.from.x).toBeCloseTo(-13.5)
    const wider = piece(dress({ backOpening: 'button band', buttonSize: 28 }), 'front')
    expect(wider.edges.find((edge) => edge.id === 'opening')!.path.segments[0]!.from.x).toBeCloseTo(-20)
  })

  it('has evenly spaced buttons on the centre line, one at the bust, each with its buttonhole', () => {
    const levels = front.marks.filter((mark) => mark.kind === 'button').map((mark) => mark.at.y)
    const gaps = levels.slice(1).map((y, index) => y - levels[index]!)
    for (const gap of gaps) expect(gap).toBeCloseTo(gaps[0]!)
    expect(levels).toContainEqual(expect.closeTo(sanityBodies.one.bustHeight))
    const holes = front.lines.filter((line) => line.id.startsWith('buttonhole-'))
    expect(holes.map((hole) => pathLength(hole.path))).toEqual(levels.map(() => expect.closeTo(18)))
    expect(draft.notions).toContainEqual({ kind: 'button', count: levels.length })
    expect(draft.notions.some((notion) => notion.kind === 'zip')).toBe(false)
  })

  it('is faced from the neck to the hem, and the facing ends where the front ends', () => {
    const facing = piece(draft, 'front-neck-facing')
    for (const id of ['neckline', 'overlap-neck', 'opening']) {
      const [mine, its] = [front, facing].map((one) => one.edges.find((edge) => edge.id === id)!.path)
      expect(its).toEqual(mine)
    }
    const seams = draft.seams.filter((seam) => seam.join === 'faced').map((seam) => seam.id)
    expect(seams).toEqual(expect.arrayContaining(['front-edge', 'overlap-neck', 'front-neckline-facing']))
  })

  it('goes straight on over the lap from the point of a V', () => {
    const pointed = piece(dress({ backOpening: 'button band', neckShape: 'V' }), 'front')
    const lap = pointed.edges.find((edge) => edge.id === 'overlap-neck')!.path.segments[0]!
    expect(lap.from.y).toBeGreaterThan(lap.to.y + 10)
  })
})

describe('A dress with a keyhole at the back', () => {
  it('is cut on both folds and shows the drop on the back and on its facing', () => {
    const draft = dress({ backOpening: 'keyhole' })
    for (const id of ['back', 'back-neck-facing']) {
      const drop = piece(draft, id).lines.find((line) => line.id === 'keyhole')!
      const [from, to] = [drop.path.segments[0]!.from, drop.path.segments.at(-1)!.to]
      expect(to.y - from.y).toBeCloseTo(110)
      expect([from.x, to.x]).toEqual([0, 0])
    }
    const facing = piece(draft, 'back-neck-facing')
    const lowest = Math.max(...facing.marks.map((mark) => mark.at.y))
    expect(lowest - facing.marks.find((mark) => mark.id === 'centreNeck')!.at.y).toBeGreaterThan(140)
  })

  it('is deepened until the head goes through, and says so', () => {
    const draft = dress({ backOpening: 'keyhole', backKeyhole: 60 }, { ...sanityBodies.one, head: 600 })
    expect(draft.cautions.map((caution) => caution.code)).toContain('keyhole-deepened')
    const mark = piece(draft, 'back').marks.find((one) => one.id === 'keyholeEnd')!
    expect(mark.at.y).toBeGreaterThan(100)
  })
})

describe('A dress with a zip in its side', () => {
  it('marks both ends of the zip on front and back alike, where no pocket can be', () => {
    const draft = dress({ backOpening: 'side zip', zipLength: 300, neckWidening: 60, frontNeckDrop: 80 })
    const zips = ['front', 'back'].map((id) =>
      piece(draft, id)
        .notches.filter((notch) => notch.id.startsWith('zip'))
        .map((notch) => notch.at),
    )
    expect(zips).toEqual([
      [30, 330],
      [30, 330],
    ])
    expect(draft.pieces.map((one) => one.id)).not.toContain('pocket-bag')
    expect(draft.cautions.map((caution) => caution.code)).not.toContain('slit-added')
  })
})

import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { chordsOf, lengthOfPath } from '../support/laws/curves'
import { ringArea, ringOf } from '../support/laws/outline'

/** Figures computed once from scratch curves, cm: expect them within three in the hundred. */
const figures = {
  one: { neck: 37.7, back: 20.1, front: 20.7, waist: 139, hip: 173, hem: 230, atBust: 112 },
  two: { neck: 42.1, back: 29.6, front: 30.3, waist: 163, hip: 198, hem: 250, atBust: 142 },
} as const

function within3(percentOf: number, value: number): void {
  expect(Math.abs(value / percentOf - 1)).toBeLessThanOrEqual(0.03)
}

describe.each(['one', 'two'] as const)('the freehand dress at 22½°, length 105, on body %s', (body) => {
  // Without a sleeve the armhole is not lowered, as in the figures.
  const draft = engine.draftGarment({
    garment: 'flared-dress',
    measurements: sanityBodies[body],
    design: { sleeve: 'none', flare: 0.25, length: 1050 },
  })
  const expected = figures[body]
  const fit = (id: string): number => (draft.fits.find((one) => one.id === id)?.length ?? NaN) / 10
  const armhole = (piece: string): number => {
    const edge = draft.pieces.find((one) => one.id === piece)?.edges.find((one) => one.role === 'armhole')
    return edge ? lengthOfPath(edge.path) / 10 : NaN
  }

  it.each(['neck', 'waist', 'hip', 'hem'] as const)('%s', (id) => within3(expected[id], fit(id)))

  it('armholes, back and front', () => {
    within3(expected.back, armhole('back'))
    within3(expected.front, armhole('front'))
  })

  it('girth at the level of the bust point', () => {
    const side = draft.pieces.find((one) => one.id === 'front')?.edges.find((one) => one.id === 'side')
    const level = sanityBodies[body].bustHeight
    const chain = side ? chordsOf(side.path) : []
    const [above, below] = [chain[0], chain[chain.length - 1]]
    if (!above || !below) throw new Error('The front has no side seam.')
    const quarter = above.x + ((below.x - above.x) * (level - above.y)) / (below.y - above.y)
    within3(expected.atBust, (4 * quarter) / 10)
  })

  it('a quarter is a quarter of bust and ease, and the neck is the neck and 0.3 to 1.2 cm', () => {
    expect(fit('bust')).toBeCloseTo(sanityBodies[body].bust / 10 + 8, 6)
    const more = fit('neck') - sanityBodies[body].neckBase / 10
    expect(more).toBeGreaterThanOrEqual(0.3)
    expect(more).toBeLessThanOrEqual(1.2)
  })
})

interface Example {
  readonly id: string
  readonly inputs: Readonly<Record<string, number>>
  readonly outputs: Readonly<Record<string, number>>
}

const shares: Readonly<Record<number, string>> = {
  0.25: '1/4',
  0.5: '1/2',
  0.75: '3/4',
  1: '1',
  1.5: '1 1/2',
}

const circles = (
  JSON.parse(readFileSync(new URL('data/worked-examples.json', import.meta.url), 'utf8')) as Example[]
).filter(({ id, inputs }) => id.startsWith('circle-') && inputs.fraction !== undefined)

describe.each(circles)('$id (geometry)', ({ inputs, outputs }) => {
  const { waist = NaN, fraction = NaN, length = NaN } = inputs
  const draft = engine.draftGarment({
    garment: 'circle-skirt',
    measurements: { waist: waist * 10, hip: (waist + 4) * 10, waistToHip: 200 },
    design: {
      share: shares[fraction] ?? '',
      panels: fraction > 1 ? 4 : 2,
      length: length * 10,
      waistEase: 0,
      opening: 'none',
    },
  })
  const panels = draft.pieces.filter((piece) => piece.id.startsWith('panel'))
  const over = (measure: (piece: (typeof panels)[number]) => number): number =>
    panels.reduce((sum, piece) => sum + (piece.cut[0]?.count ?? 0) * measure(piece), 0)

  it('radius of waist and hem', () => {
    for (const piece of panels) {
      const at = (id: string): { x: number; y: number } =>
        piece.marks.find((mark) => mark.id === id)?.at ?? { x: NaN, y: NaN }
      const [apex, inner, outer] = [at('apex'), at('waistMiddle'), at('hemMiddle')]
      expect(Math.abs(inner.y - apex.y - (outputs.radius ?? NaN) * 10)).toBeLessThanOrEqual(0.01)
      expect(Math.abs(outer.y - apex.y - (outputs.outer ?? NaN) * 10)).toBeLessThanOrEqual(0.01)
    }
  })

  it('sweep of the hem, girth 20 cm down, area', () => {
    const hem = over((piece) => {
      const edge = piece.edges.find((one) => one.id === 'hem')
      return edge ? lengthOfPath(edge.path) : NaN
    })
    expect(Math.abs(hem / 10 - (outputs.hem_sweep ?? NaN))).toBeLessThanOrEqual(0.01)
    const hip = draft.fits.find((one) => one.id === 'hip')?.length ?? NaN
    expect(Math.abs(hip / 10 - (outputs.girth_at_20 ?? NaN))).toBeLessThanOrEqual(0.01)
    const area = over((piece) => {
      const ring = ringOf({ closed: true, segments: piece.edges.flatMap((one) => one.path.segments) }, 0.005)
      return ringArea(ring) / 2
    })
    expect(Math.abs(area / 100 / (outputs.area_cm2 ?? NaN) - 1)).toBeLessThanOrEqual(0.0005)
  })
})

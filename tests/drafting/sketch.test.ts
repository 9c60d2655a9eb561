import { describe, expect, it } from 'vitest'
import { draftGarment, garments } from '@/drafting'
import { sizeTables } from '@/drafting/body'
import { bounds } from '@/drafting/geometry'
import { sketch } from '@/drafting/sketch'
import { pictureOf } from '@/drafting/sketch/picture'

const sizes = sizeTables
  .flatMap((table) => table.sizes)
  .filter(({ card }) => card.bust && card.waist && card.hip)
const middle = sizes[Math.floor(sizes.length / 2)]?.card ?? {}
const drawn = (garment: string, design = {}) =>
  sketch(draftGarment({ garment, measurements: middle, design, explain: false }))

describe.each(garments.map((garment) => [garment.name, garment] as const))(
  'the picture of a %s',
  (_, garment) => {
    const { lines, bounds: box } = drawn(garment.id)

    it('is a garment’s size, and everything drawn lies in it', () => {
      expect(lines.some(({ kind }) => kind === 'shape')).toBe(true)
      for (const side of [box.max.x - box.min.x, box.max.y - box.min.y]) {
        expect(side).toBeGreaterThan(250)
        expect(side).toBeLessThan(3500)
      }
      for (const { path } of lines) {
        const own = bounds(path)
        expect(own.min.x).toBeGreaterThanOrEqual(box.min.x)
        expect(own.max.y).toBeLessThanOrEqual(box.max.y)
      }
    })

    it('with a front is as wide to the left of its centre as to the right', () => {
      const { pieces } = draftGarment({ garment: garment.id, measurements: middle, explain: false })
      if (pieces.some(({ id }) => id === 'front')) expect(Math.abs(box.max.x + box.min.x)).toBeLessThan(1)
    })

    it('has closed outlines', () => {
      for (const { kind, path } of lines) if (kind === 'shape') expect(path.closed).toBe(true)
    })
  },
)

it('no two garments look alike', () => {
  const pictures = garments.map(({ id }) => JSON.stringify(pictureOf(drawn(id))))
  expect(new Set(pictures).size).toBe(garments.length)
})

it('each neck shape, sleeve, collar and way of closing in front can be told apart', () => {
  const dress = garments.find(({ id }) => id === 'flared-dress')
  for (const id of ['neckShape', 'sleeve', 'collar']) {
    const choices = dress?.design.find((value) => value.id === id)?.choices ?? []
    const pictures = choices.map((choice) =>
      JSON.stringify(pictureOf(drawn('flared-dress', { [id]: choice }))),
    )
    expect(new Set(pictures).size).toBe(choices.length)
  }
})

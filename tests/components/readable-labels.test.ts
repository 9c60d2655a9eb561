import { describe, expect, it } from 'vitest'
import { readableLabels } from '@/components/sheet/readable-labels'
import { draftGarment } from '@/drafting'
import { boundsOf } from '@/drafting/drawing/bounds'
import { drawing } from '@/drafting/drawing'
import { sanityBodies } from '../support/bodies'

const draft = draftGarment({ garment: 'flared-dress', measurements: sanityBodies.one })
/** As the whole dress shows on a laptop, px a mm. */
const all = 0.5
const { items } = drawing(draft, { textScale: 3 })
const texts = (scale: number) =>
  readableLabels(items, scale).flatMap((item) => (item.kind === 'text' ? [item] : []))

describe('with the whole dress on the screen', () => {
  it('every piece says its name, large enough to be read', () => {
    const names = texts(all).filter(({ style }) => style === 'label-name')
    expect(new Set(names.map(({ text }) => text))).toEqual(new Set(draft.pieces.map(({ name }) => name)))
    for (const { size } of names) expect(size * all).toBeGreaterThanOrEqual(7)
  })

  it('nothing is written that cannot be read', () => {
    for (const { layer, size } of texts(all))
      if (layer !== 'dimension') expect(size * all).toBeGreaterThanOrEqual(7)
  })

  it('a name that has no room in its piece stands below it', () => {
    const facing = draft.pieces.find(({ id }) => id === 'back-neck-facing')
    const name = texts(all).find(({ text }) => text === facing?.name)
    const piece = boundsOf(items.filter((item) => item.kind === 'path' && item.piece === facing?.id))
    expect(name?.at.y).toBeGreaterThan(piece.max.y)
  })
})

it('close to a piece, its labels are as they are printed', () => {
  expect(readableLabels(items, 6)).toEqual(items)
})

import { describe, expect, test } from 'vitest'
import { draftGarment } from '@/drafting'
import { layOut, paperOf, placePath } from '@/drafting/drawing'
import { outline } from '@/drafting/drawing/outline'
import { pack } from '@/drafting/drawing/pack'
import { containsPoint, flatten } from '@/drafting/geometry/path'
import { intersections } from '@/drafting/geometry/intersect'
import { sanityBodies } from '../../support/bodies'

const dress = (measurements: Readonly<Record<string, number>>) =>
  draftGarment({ garment: 'flared-dress', measurements, explain: false })

describe.each([
  ['body one', sanityBodies.one],
  ['body two', sanityBodies.two],
] as const)('the dress of %s on paper', (_, body) => {
  const draft = dress(body)

  test.each([1.0, 1.3, 2.2])('no piece lies on another on a sheet of %f times the tallest', (times) => {
    const places = pack(draft, { gap: 15, allowances: true, height: 1100 * times })
    const laid = draft.pieces.map((piece) => placePath(outline(piece, true), places[piece.id]))
    expect(Object.keys(places).sort()).toEqual(draft.pieces.map((piece) => piece.id).sort())
    laid.forEach((path, index) => {
      for (const other of laid.slice(index + 1)) {
        expect(intersections(path, other)).toEqual([])
        const [point] = flatten(other)
        expect(point && containsPoint(path, point)).toBe(false)
      }
    })
  })

  test('a flare against a flare saves a tenth of the sheets and more', () => {
    const count = (draftOnPaper: ReturnType<typeof layOut>) =>
      draftOnPaper.tiling.pages.filter((page) => !page.blank).length
    const paper = paperOf('a4')
    const together = count(layOut({ draft, paper, orientation: 'fewest', allowances: true }))
    const alone = draft.pieces
      .map((piece) =>
        count(
          layOut({ draft: { ...draft, pieces: [piece] }, paper, orientation: 'fewest', allowances: true }),
        ),
      )
      .reduce((sum, sheets) => sum + sheets, 0)
    expect(together).toBeLessThan(alone * 0.9)
  })

  test('the same draft lies in the same places', () => {
    const lay = () => pack(draft, { gap: 15, allowances: true, height: 1500 })
    expect(lay()).toEqual(lay())
  })
})

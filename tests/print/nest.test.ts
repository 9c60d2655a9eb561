import { beforeAll, describe, expect, test } from 'vitest'
import { documentOf, type PatternRequest } from '@/app/_server/print/pattern-pdf'
import { nest } from '@/drafting'
import { completeCard, sizeTables } from '@/drafting/body'
import type { Path } from '@/drafting/contract'
import { layOut, nestRoom, paperOf } from '@/drafting/drawing'
import { pathLength, pointAt, tangentOn } from '@/drafting/geometry/path'
import { pageText, rendered, words } from './support/rendered'
import { lineAt } from './support/seam-found'
import { tape, type TapedPage } from './support/taped'

const sizes = (sizeTables[0]?.sizes ?? [])
  .filter(({ id }) => id.endsWith('curvy'))
  .slice(2, 7)
  .map(({ id, name, card }) => ({ id, name, card: completeCard(card).card }))

/** Five sizes of a skirt on each other at the centre of the waist: the first and the last are drawn in whole lines. */
describe('a nest of sizes on A4', () => {
  const found = nest({ garment: 'straight-skirt', measurements: {} }, sizes, { alignAt: 'centreWaist' })
  const request: PatternRequest = {
    draft: nestRoom(found, true),
    nest: found,
    title: { name: 'Skirt, five sizes', garment: 'Straight skirt', maker: 'Invented workroom' },
    paper: paperOf('a4'),
    orientation: 'fewest',
    allowances: true,
    savedAt: new Date('2026-01-01T12:00:00Z'),
  }
  const laid = layOut(request)
  let pdf: Uint8Array
  let taped: readonly TapedPage[] = []

  beforeAll(async () => {
    pdf = await documentOf(request, laid)
    const first = laid.tiling.pages.find((page) => !page.blank)?.window ?? { x: 0, y: 0 }
    const { margin } = laid.tiling
    const laidFirst = { turn: 0, x: first.x - margin, y: first.y - margin }
    taped = tape(rendered(pdf).slice(1), words(pdf).slice(1), laidFirst)
  }, 120_000)

  test('every line of the smallest and the largest size is found within 0.3 mm of where it belongs', () => {
    const whole = [found.sizes[0]?.style, found.sizes.at(-1)?.style]
    const lines = laid.drawing.items.flatMap((item): Path[] =>
      item.kind === 'path' && item.layer === 'cut' && whole.includes(item.style) ? [item.path] : [],
    )
    expect(lines.length).toBeGreaterThanOrEqual(2 * found.pieces.length)
    let seen = 0
    for (const path of lines) {
      for (let along = 30; along < pathLength(path); along += 40) {
        const [spot, tangent] = [pointAt(path, along), tangentOn(path, along)]
        if (!wellInside(spot) || crowded(spot, path)) continue
        const line = lineAt(taped, spot, tangent, 0.45)
        expect(Math.hypot(line.x - spot.x, line.y - spot.y)).toBeLessThan(0.3)
        seen += 1
      }
    }
    expect(seen).toBeGreaterThan(20)
  })

  test('the sizes lie as far apart on paper as their measurements say', () => {
    const [small, large] = [found.sizes[0], found.sizes.at(-1)]
    const hip = (id: string | undefined) =>
      found.fits.find((fit) => fit.id === 'hip')?.sizes[id ?? '']?.length ?? NaN
    const side = (style: string | undefined) => {
      const item = laid.drawing.items.find(
        (one) => one.kind === 'path' && one.piece === 'front' && one.layer === 'cut' && one.style === style,
      )
      if (item?.kind !== 'path') throw new Error('The front is not drawn.')
      return (
        Math.max(...item.path.segments.map(({ to }) => to.x)) -
        Math.min(...item.path.segments.map(({ to }) => to.x))
      )
    }
    expect(side(large?.style) - side(small?.style)).toBeCloseTo((hip(large?.id) - hip(small?.id)) / 4, 0)
  })

  test('the first page lists the sizes, and their names stand on the sheets', () => {
    for (const { name } of found.sizes) {
      expect(pageText(pdf, 1)).toContain(`size ${name}`)
      expect(
        words(pdf)
          .slice(1)
          .flat()
          .map(({ text }) => text),
      ).toContain(name.split(' ')[0])
    }
  })

  /** Whether a spot lies clear of the joins between pages, where trim lines and marks are. */
  function wellInside({ x, y }: { x: number; y: number }): boolean {
    return laid.tiling.pages.some(({ window: { x: left, y: top, width, height }, blank }) => {
      const room = Math.min(x - left, y - top, left + width - x, top + height - y)
      return !blank && room > 20
    })
  }

  /** Whether another drawn line is so near that the picture cannot tell them apart. */
  function crowded(spot: { x: number; y: number }, own: Path): boolean {
    return laid.drawing.items.some((item) => {
      if (item.kind === 'text')
        return Math.hypot(item.at.x - spot.x, item.at.y - spot.y) < item.text.length * 4
      if (item.path === own) return false
      for (let along = 0; along <= pathLength(item.path); along += 1.5) {
        const near = pointAt(item.path, along)
        if (Math.hypot(near.x - spot.x, near.y - spot.y) < 4) return true
      }
      return false
    })
  }
})

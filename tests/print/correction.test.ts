import { beforeAll, describe, expect, test } from 'vitest'
import { patternPdf } from '@/app/_server/print/pattern-pdf'
import type { PatternRequest } from '@/app/_server/print/pattern-pdf'
import { draftGarment } from '@/drafting'
import type { Path } from '@/drafting/contract'
import { layOut, paperOf } from '@/drafting/drawing'
import type { LaidOut } from '@/drafting/drawing'
import { pathLength, pointAt, tangentOn } from '@/drafting/geometry/path'
import { transformPath } from '@/drafting/geometry/transform'
import { sanityBodies } from '../support/bodies'
import { findSquares } from './support/find-squares'
import type { Spot } from './support/find-marks'
import { inkedNearEdge } from './support/near-edge'
import { printedOn } from './support/printer'
import type { Printed } from './support/printer'
import { lineAt } from './support/seam-found'
import { tape } from './support/taped'
import type { TapedPage } from './support/taped'

const draft = draftGarment({ garment: 'flared-dress', measurements: sanityBodies.two, explain: false })

function request(
  orientation: PatternRequest['orientation'],
  measured: PatternRequest['measured'],
): PatternRequest {
  return {
    draft,
    title: { name: 'Trial', garment: 'Trial', maker: 'Invented workroom' },
    paper: paperOf('a4'),
    orientation,
    allowances: true,
    measured,
    savedAt: new Date('2026-01-01T12:00:00Z'),
  }
}

/** Where every cut line belongs on the print: the drawing on the page as the printer then stretches it. */
function cutsOnPaper(
  { drawing, tiling }: LaidOut,
  printer: { short: number; long: number },
): readonly Path[] {
  const upright = tiling.orientation === 'portrait'
  const a = (upright ? printer.short : printer.long) / 100
  const d = (upright ? printer.long : printer.short) / 100
  return drawing.items.flatMap((item) =>
    item.kind === 'path' && item.layer === 'cut' && item.style === 'cut'
      ? [transformPath({ a, b: 0, c: 0, d, e: 0, f: 0 }, item.path)]
      : [],
  )
}

/** Spots along the paths, mm apart, off their ends, where other lines meet them. */
function spotsAlong(paths: readonly Path[], apart: number): readonly { at: Spot; tangent: Spot }[] {
  return paths.flatMap((path) => {
    const spots = []
    for (let along = 6; along < pathLength(path) - 6; along += apart)
      spots.push({ at: pointAt(path, along), tangent: tangentOn(path, along) })
    return spots
  })
}

describe.each([
  { printer: { short: 98.5, long: 99.2 }, orientation: 'landscape' },
  { printer: { short: 101.2, long: 100.4 }, orientation: 'fewest' },
] as const)(
  'a printer that makes $printer.short × $printer.long of 100, $orientation',
  ({ printer, orientation }) => {
    const asked = request(orientation, printer)
    const laidOut = layOut(asked)
    const sheets = laidOut.tiling.pages.filter((page) => !page.blank)
    let printed: Printed
    let taped: readonly TapedPage[]

    beforeAll(async () => {
      printed = await printedOn(await patternPdf(asked), printer)
      const { window } = sheets[0] ?? { window: { x: 0, y: 0 } }
      const upright = laidOut.tiling.orientation === 'portrait'
      const across = (upright ? printer.short : printer.long) / 100
      const down = (upright ? printer.long : printer.short) / 100
      const { margin } = laidOut.tiling
      const start = { turn: 0, x: (window.x - margin) * across, y: (window.y - margin) * down }
      taped = tape(printed.pictures.slice(1), printed.words.slice(1), start)
    }, 240_000)

    test('prints test squares of 10 cm and 4 in, both ways', () => {
      const cover = printed.pictures[0]
      if (!cover) throw new Error('there is no first page')
      for (const side of [100, 101.6]) {
        const fits = findSquares(cover, side).filter(
          ({ left, right, top, bottom }) =>
            Math.abs(right - left - side) < 0.1 && Math.abs(bottom - top - side) < 0.1,
        )
        expect(fits).toHaveLength(1)
      }
    })

    test('keeps everything 10 mm inside the paper', () => {
      for (const picture of printed.pictures) expect(inkedNearEdge(picture, 9.95)).toBe(0)
    })

    test('gives a pattern whose whole outline, taped by its marks, is within 0.3 mm of the draft', () => {
      const spots = spotsAlong(cutsOnPaper(laidOut, printer), 12)
      const off: number[] = []
      for (const { at, tangent } of spots) {
        const found = lineIn(taped, at, tangent)
        if (found) off.push(Math.hypot(found.x - at.x, found.y - at.y))
      }
      expect(Math.max(...off)).toBeLessThan(0.3)
      // A line cannot be read where another runs along it: a trim line, a mark, a notch.
      expect(off.length).toBeGreaterThan(spots.length * 0.98)
      expect(off.length).toBeGreaterThan(500)
    })
  },
)

function lineIn(pages: readonly TapedPage[], at: Spot, tangent: Spot): Spot | null {
  try {
    return lineAt(pages, at, tangent, 0.6, 0.9)
  } catch {
    return null
  }
}

test('without correction the same printer is found out by its square', async () => {
  const { pictures } = await printedOn(
    await patternPdf({ ...request('portrait', undefined), pieces: ['back-neck-facing'] }),
    {
      short: 98.5,
      long: 99.2,
    },
  )
  const [cover] = pictures
  if (!cover) throw new Error('there is no first page')
  const [square] = findSquares(cover, 99)
  expect((square?.right ?? 0) - (square?.left ?? 0)).toBeCloseTo(98.5, 0)
  expect((square?.bottom ?? 0) - (square?.top ?? 0)).toBeLessThan(99.6)
})

import { beforeAll, describe, expect, test } from 'vitest'
import { patternPdf } from '@/app/_server/print/pattern-pdf'
import type { PatternRequest } from '@/app/_server/print/pattern-pdf'
import { draftGarment } from '@/drafting'
import type { Draft, Path } from '@/drafting/contract'
import { layOut, paperOf } from '@/drafting/drawing'
import type { LaidOut, PaperId } from '@/drafting/drawing'
import { pathLength, pointAt, tangentOn } from '@/drafting/geometry/path'
import { sanityBodies } from '../support/bodies'
import { sampleDraft } from '../support/sample-draft'
import { findSquares } from './support/find-squares'
import { inkedNearEdge } from './support/near-edge'
import type { Spot } from './support/find-marks'
import { rendered, words } from './support/rendered'
import type { PagePicture } from './support/rendered'
import { lineAt, meeting } from './support/seam-found'
import { tape } from './support/taped'
import type { TapedPage } from './support/taped'

function requestFor(
  draft: Draft,
  paper: PaperId,
  orientation: PatternRequest['orientation'],
): PatternRequest {
  return {
    draft,
    title: { name: 'Trial 3 1/2', garment: 'Trial', maker: 'Invented workroom' },
    paper: paperOf(paper),
    orientation,
    // The nett line is drawn solid, so that its corners can be found.
    allowances: false,
    savedAt: new Date('2026-01-01T12:00:00Z'),
  }
}

/** A flared dress of a full body: its sides run over five sheets and more. */
const dress = () =>
  draftGarment({
    garment: 'flared-dress',
    measurements: sanityBodies.two,

    explain: false,
  })

describe.each([
  {
    of: 'a sample',
    paper: 'a4',
    orientation: 'portrait',
    drafted: sampleDraft,
    seam: { piece: 'front-panel', edge: 'side' },
  },
  {
    of: 'a dress',
    paper: 'a4',
    orientation: 'fewest',
    drafted: dress,
    seam: { piece: 'front', edge: 'side' },
  },
  {
    of: 'a dress',
    paper: 'letter',
    orientation: 'fewest',
    drafted: dress,
    seam: { piece: 'back', edge: 'side' },
  },
] as const)('$of on $paper, $orientation', ({ paper, orientation, drafted, seam }) => {
  const draft = drafted()
  const request = requestFor(draft, paper, orientation)
  const laidOut: LaidOut = layOut(request)
  const printed = laidOut.tiling.pages.filter((page) => !page.blank)
  let pictures: readonly PagePicture[] = []
  let taped: readonly TapedPage[] = []

  beforeAll(async () => {
    const pdf = await patternPdf(request)
    pictures = rendered(pdf)
    const first = printed[0]?.window ?? { x: 0, y: 0 }
    const { margin } = laidOut.tiling
    taped = tape(pictures.slice(1), words(pdf).slice(1), {
      turn: 0,
      x: first.x - margin,
      y: first.y - margin,
    })
  }, 120_000)

  test('blank pages are left out and every printed page is there once', () => {
    expect(pictures).toHaveLength(printed.length + 1)
    expect(taped.map((page) => page.name).sort()).toEqual(printed.map((page) => page.name).sort())
  })

  test('the test squares found in the picture are 10 cm and 4 in', () => {
    const cover = pictures[0]
    if (!cover) throw new Error('there is no first page')
    for (const side of [100, 101.6]) {
      const squares = findSquares(cover, side).map((square) => [
        square.right - square.left,
        square.bottom - square.top,
      ])
      const fits = squares.filter(
        ([width = 0, height = 0]) => Math.abs(width - side) < 0.1 && Math.abs(height - side) < 0.1,
      )
      expect(fits, `of ${JSON.stringify(squares)}`).toHaveLength(1)
    }
  })

  test('nothing is drawn within 10 mm of the edge of any page', () => {
    for (const picture of pictures) expect(inkedNearEdge(picture, 10)).toBe(0)
  })

  test('every match mark is found on its page within 0.1 mm of where it belongs', () => {
    for (const page of printed) {
      const found = taped.find((each) => each.name === page.name)
      expect(found?.marks.map((mark) => mark.name).sort()).toEqual(page.marks.map((mark) => mark.name).sort())
      for (const mark of page.marks) {
        const spot = found?.marks.find((each) => each.name === mark.name)
        const x = mark.at.x - page.window.x + laidOut.tiling.margin
        const y = mark.at.y - page.window.y + laidOut.tiling.margin
        expect(Math.hypot((spot?.x ?? 0) - x, (spot?.y ?? 0) - y), `${page.name} ${mark.name}`).toBeLessThan(
          0.1,
        )
      }
    }
  })

  test('a long seam measures true across the taped sheet, within 0.3 mm', () => {
    const piece = draft.pieces.find((each) => each.id === seam.piece)
    if (!piece) throw new Error(`${seam.piece} is not in the draft`)
    const at = piece.edges.findIndex((edge) => edge.id === seam.edge)
    const around = [at - 1, at, at + 1].map((index) => {
      const edge = piece.edges[(index + piece.edges.length) % piece.edges.length]
      const item = laidOut.drawing.items.find(
        (each) => each.id === `${piece.id}/stitch/${edge?.id}` || each.id === `${piece.id}/fold/${edge?.id}`,
      )
      if (item?.kind !== 'path') throw new Error(`${edge?.id} is not drawn`)
      return item.path
    })
    const [before, path, after] = around
    if (!before || !path || !after) throw new Error('a seam runs between two edges')

    const [truth, measured] = [exactly, inPicture(taped)].map((look) => seamLength(look, before, path, after))
    expect(pathLength(path)).toBeGreaterThan(500)
    expect(Math.abs((measured ?? 0) - (truth ?? 0)), `${measured} for ${truth}`).toBeLessThan(0.3)
    // The truth measured the same way is the length the engine states, but for the rounding of corners.
    expect(Math.abs((truth ?? 0) - pathLength(path))).toBeLessThan(0.3)
  })
})

/** Looks where a path passes at a distance along it. */
type Look = (path: Path, along: number) => Spot

const exactly: Look = (path, along) => pointAt(path, along)

const inPicture =
  (pages: readonly TapedPage[]): Look =>
  (path, along) =>
    lineAt(pages, pointAt(path, along), tangentOn(path, along), 0.6)

/** The length of a seam through spots found every 15 mm, from the corner with the edge before to that with the edge after. */
function seamLength(look: Look, before: Path, path: Path, after: Path): number {
  const length = pathLength(path)
  const endOfBefore = pathLength(before)
  const near = [4, 9] as const
  const start = meeting(
    [look(before, endOfBefore - near[1]), look(before, endOfBefore - near[0])],
    [look(path, near[0]), look(path, near[1])],
  )
  const end = meeting(
    [look(path, length - near[1]), look(path, length - near[0])],
    [look(after, near[0]), look(after, near[1])],
  )
  const between: Spot[] = []
  for (let along = near[0]; along <= length - near[0]; along += 15) between.push(look(path, along))
  const spots = [start, ...between, end]
  return spots.slice(1).reduce((sum, spot, index) => {
    const last = spots[index] ?? spot
    return sum + Math.hypot(spot.x - last.x, spot.y - last.y)
  }, 0)
}

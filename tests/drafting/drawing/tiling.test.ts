import { describe, expect, test } from 'vitest'
import { crosses, inkOf, layOut, paperOf, tilePages } from '@/drafting/drawing'
import type { Drawing, DrawingItem, Path, Point } from '@/drafting/contract'
import { sampleDraft } from '../../support/sample-draft'

function cutItem(id: string, ...points: Point[]): DrawingItem {
  const path: Path = {
    segments: points.slice(1).map((to, index) => ({ kind: 'line', from: points[index] ?? to, to })),
    closed: false,
  }
  return { kind: 'path', path, layer: 'cut', style: 'cut', id }
}

function sheet(width: number, height: number, ...items: DrawingItem[]): Drawing {
  return { items, bounds: { min: { x: 0, y: 0 }, max: { x: width, y: height } } }
}

const a4 = paperOf('a4')
const frame = (width: number, height: number) =>
  cutItem(
    'frame',
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: height },
    { x: 0, y: height },
    { x: 0, y: 0 },
  )

describe('tiling', () => {
  test('a drawing that fits the printable area takes one page without marks', () => {
    const tiling = tilePages(sheet(180, 260, frame(180, 260)), { paper: a4 })
    expect(tiling.pages).toHaveLength(1)
    expect(tiling.pages[0]).toMatchObject({ name: 'A1', blank: false, marks: [] })
  })

  test('every shared edge of two printed pages has two marks, alike on both, and 10 mm inside either paper', () => {
    const { tiling } = layOut({ draft: sampleDraft(), paper: a4, orientation: 'fewest', allowances: true })
    const printed = tiling.pages.filter((page) => !page.blank)
    for (const page of printed) {
      for (const mark of page.marks) {
        const x = mark.at.x - page.window.x + tiling.margin
        const y = mark.at.y - page.window.y + tiling.margin
        // The mark's cross reaches 4.5 mm from its middle.
        expect(Math.min(x, y, tiling.width - x, tiling.height - y)).toBeGreaterThanOrEqual(14.5)
        const twins = printed.filter(
          (other) => other !== page && other.marks.some((each) => each.name === mark.name),
        )
        expect(twins).toHaveLength(1)
        expect(twins[0]?.marks.find((each) => each.name === mark.name)?.at).toEqual(mark.at)
      }
      for (const [dr, dc, side] of [
        [0, 1, 'right'],
        [1, 0, 'bottom'],
        [0, -1, 'left'],
        [-1, 0, 'top'],
      ] as const) {
        const neighbour = printed.some(
          (other) => other.row === page.row + dr && other.column === page.column + dc,
        )
        expect(page.marks.filter((mark) => mark.side === side)).toHaveLength(neighbour ? 2 : 0)
      }
    }
  })

  test('pages on which nothing is drawn are blank, even inside the box around a curve or a corner', () => {
    const corner = cutItem('corner', { x: 0, y: 0 }, { x: 0, y: 800 }, { x: 800, y: 800 })
    const tiling = tilePages(sheet(800, 800, corner), { paper: a4, orientation: 'portrait' })
    const printed = tiling.pages.filter((page) => !page.blank)
    expect(printed.map((page) => page.name)).toEqual(['A1', 'B1', 'C1', 'C2', 'C3', 'C4', 'C5'])
  })

  test('a page wholly inside a piece is kept, because it holds the others together', () => {
    const square = [
      { x: 0, y: 0 },
      { x: 800, y: 0 },
      { x: 800, y: 800 },
      { x: 0, y: 800 },
      { x: 0, y: 0 },
    ]
    const drawn = sheet(800, 800, frame(800, 800))
    const blanks = (regions: Point[][]) =>
      tilePages(drawn, { paper: a4, orientation: 'portrait', regions }).pages.filter((page) => page.blank)
        .length
    expect(blanks([])).toBeGreaterThan(0)
    expect(blanks([square])).toBe(0)
  })

  test('the trimmed pages cover every stroke of the drawing', () => {
    const { drawing, tiling } = layOut({
      draft: sampleDraft(),
      paper: paperOf('letter'),
      orientation: 'landscape',
      allowances: true,
    })
    const printed = tiling.pages.filter((page) => !page.blank)
    for (const item of drawing.items) {
      for (const point of inkOf(item).points) {
        const covered = printed.some(
          ({ window }) =>
            point.x >= window.x &&
            point.x <= window.x + window.width &&
            point.y >= window.y &&
            point.y <= window.y + window.height,
        )
        expect(covered, `${item.id} at ${point.x}, ${point.y}`).toBe(true)
      }
    }
  })

  test('the way of the paper that needs fewer pages is taken', () => {
    const wide = sheet(260, 180, frame(260, 180))
    expect(tilePages(wide, { paper: a4 }).orientation).toBe('landscape')
    expect(tilePages(wide, { paper: a4 }).pages).toHaveLength(1)
    expect(tilePages(wide, { paper: a4, orientation: 'portrait' }).pages).toHaveLength(2)
  })

  test('a line is found where it runs, not where its box is', () => {
    const ink = inkOf(cutItem('slant', { x: 0, y: 0 }, { x: 100, y: 100 }))
    expect(crosses(ink, { x: 40, y: 40, width: 10, height: 10 })).toBe(true)
    expect(crosses(ink, { x: 60, y: 10, width: 30, height: 30 })).toBe(false)
  })

  test('an unknown paper is refused by name', () => {
    expect(() => paperOf('a9' as 'a4')).toThrow(/a4, letter/)
  })
})

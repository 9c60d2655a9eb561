import 'server-only'
import type { Path, Point } from '@/drafting/contract'
import type { Style, Tiling, TilePage } from '@/drafting/drawing'
import { add } from '@/drafting/geometry/point'
import { transformPath } from '@/drafting/geometry/transform'
import type { PageContent } from './page-content'

const outlined: Style = { stroke: 'walnut', width: 0.15 }
/** Of a piece, drawn small. */
const shape: Style = { stroke: 'madder', width: 0.2 }
const lit: Style = { fill: 'indigo' }

export interface MapOptions {
  /** Room the map may take, mm. */
  readonly width: number
  readonly height: number
  /** Write the names into the cells. */
  readonly names?: boolean
  /** Of the pieces, to be drawn small across the cells. */
  readonly outlines?: readonly Path[]
}

/** The part of a page that is its own once the sheets are trimmed and taped, mm. */
function own(tiling: Tiling): { width: number; height: number } {
  const lost = 2 * tiling.margin + tiling.overlap
  return { width: tiling.width - lost, height: tiling.height - lost }
}

/** The size a map of the pages takes within the room it is given, in the proportions of the taped sheet. */
export function mapSize(
  tiling: Tiling,
  room: { width: number; height: number },
): { width: number; height: number } {
  const page = own(tiling)
  const wide = tiling.columns * page.width
  const high = tiling.rows * page.height
  const scale = Math.min(room.width / wide, room.height / high)
  return { width: wide * scale, height: high * scale }
}

/** The cells of a map that takes a room: their size, and where each page's lies from the map's corner. */
function cellsOf(tiling: Tiling, room: { width: number; height: number }) {
  const size = mapSize(tiling, room)
  const cell = { width: size.width / tiling.columns, height: size.height / tiling.rows }
  const gap = Math.min(cell.width, cell.height) * 0.08
  return {
    width: cell.width - gap,
    height: cell.height - gap,
    /** Map millimetres for one of the sheet's. */
    scale: cell.width / own(tiling).width,
    cornerOf: ({ column, row }: TilePage): Point => ({
      x: column * cell.width + gap / 2,
      y: row * cell.height + gap / 2,
    }),
  }
}

/** How the pages lie together: a cell for each that is printed, nothing where a page is left out. */
export function drawMap(content: PageContent, tiling: Tiling, at: Point, options: MapOptions): void {
  const cells = cellsOf(tiling, options)
  drawOutlines(content, tiling, at, cells.scale, options.outlines ?? [])
  const printed = tiling.pages.filter((page) => !page.blank)
  const corners = printed.map((page) => add(at, cells.cornerOf(page)))
  content.boxes(corners, cells.width, cells.height, outlined)
  if (options.names) drawNames(content, printed, corners, cells)
}

/** Fills one page's cell of a map that was drawn in the same room. */
export function lightCell(
  content: PageContent,
  tiling: Tiling,
  at: Point,
  room: { width: number; height: number },
  page: TilePage,
): void {
  const cells = cellsOf(tiling, room)
  content.boxes([add(at, cells.cornerOf(page))], cells.width, cells.height, lit)
}

function drawNames(
  content: PageContent,
  pages: readonly TilePage[],
  corners: readonly Point[],
  { width, height }: { readonly width: number; readonly height: number },
): void {
  const size = Math.min(width / 2.4, height / 1.8, 4.2)
  pages.forEach((page, index) => {
    const middle = add(corners[index] ?? { x: 0, y: 0 }, { x: width / 2, y: height / 2 + size * 0.33 })
    content.text(page.name, middle, { size, align: 'middle' })
  })
}

function drawOutlines(
  content: PageContent,
  tiling: Tiling,
  at: Point,
  scale: number,
  outlines: readonly Path[],
): void {
  const first = tiling.pages[0]
  if (!first) return
  const half = tiling.overlap / 2
  const e = at.x - (first.window.x + half) * scale
  const f = at.y - (first.window.y + half) * scale
  for (const outline of outlines) {
    content.path(transformPath({ a: scale, b: 0, c: 0, d: scale, e, f }, outline), shape)
  }
}

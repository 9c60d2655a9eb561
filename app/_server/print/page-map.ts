import 'server-only'
import type { Path } from '@/drafting/contract'
import type { Style, Tiling, TilePage } from '@/drafting/drawing'
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
  /** The page to light. */
  readonly here?: TilePage
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

/** How the pages lie together: a cell for each that is printed, nothing where a page is left out, this page filled. */
export function drawMap(
  content: PageContent,
  tiling: Tiling,
  at: { x: number; y: number },
  options: MapOptions,
): void {
  const size = mapSize(tiling, options)
  const cell = { width: size.width / tiling.columns, height: size.height / tiling.rows }
  const gap = Math.min(cell.width, cell.height) * 0.08
  drawOutlines(content, tiling, at, cell.width / own(tiling).width, options.outlines ?? [])
  const box = { width: cell.width - gap, height: cell.height - gap }
  const cornerOf = (page: TilePage) => ({
    x: at.x + page.column * cell.width + gap / 2,
    y: at.y + page.row * cell.height + gap / 2,
  })
  const printed = tiling.pages.filter((page) => !page.blank)
  const [here, others] = [true, false].map((wanted) =>
    printed.filter((page) => (page.name === options.here?.name) === wanted).map(cornerOf),
  )
  content.boxes(others ?? [], box.width, box.height, outlined)
  content.boxes(here ?? [], box.width, box.height, lit)
  if (options.names) drawNames(content, printed, cornerOf, box)
}

function drawNames(
  content: PageContent,
  pages: readonly TilePage[],
  cornerOf: (page: TilePage) => { x: number; y: number },
  { width, height }: { width: number; height: number },
): void {
  const size = Math.min(width / 2.4, height / 1.8, 4.2)
  for (const page of pages) {
    const corner = cornerOf(page)
    content.text(
      page.name,
      { x: corner.x + width / 2, y: corner.y + height / 2 + size * 0.33 },
      { size, align: 'middle' },
    )
  }
}

function drawOutlines(
  content: PageContent,
  tiling: Tiling,
  at: { x: number; y: number },
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

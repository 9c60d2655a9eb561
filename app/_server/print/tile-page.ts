import 'server-only'
import type { Drawing } from '@/drafting/contract'
import { crosses, pageName } from '@/drafting/drawing'
import type { MatchMark, PageWindow, Style, TilePage, Tiling } from '@/drafting/drawing'
import { lightCell, mapSize } from './page-map'
import type { PageContent } from './page-content'
import { drawItems, itemsIn } from './page-items'
import type { Placed } from './page-items'
import { mapRoom } from './stamps'

const hairline: Style = { stroke: 'walnut', width: 0.1 }
const trim: Style = { stroke: 'walnut', width: 0.2 }
const lay: Style = { stroke: 'walnut', width: 0.15, dash: [2, 2] }

/** Room for the caption beside the map, mm. */
export const captionWidth = 44

/** Half of the widest line, kept inside the safe edge, mm. */
const inset = 0.1

export interface TileContext {
  readonly tiling: Tiling
  readonly items: readonly Placed[]
  /** Lines that tell this pattern from another. */
  readonly caption: readonly string[]
  /** Of the printed pages, by name. */
  readonly sheets: ReadonlyMap<string, number>
}

/** One page of the pattern: what the drawing shows there, how it joins its neighbours, and where it belongs. */
export function drawTile(content: PageContent, page: TilePage, context: TileContext): void {
  const { tiling } = context
  const { margin } = tiling
  const printable = {
    x: margin,
    y: margin,
    width: tiling.width - 2 * margin,
    height: tiling.height - 2 * margin,
  }
  const items = itemsIn(context.items, page.window)
  content.within(printable, page.window, () => drawItems(content, items, page.window))
  content.within(printable, printable, () =>
    content.on('Sheet', () => {
      drawSides(content, page, tiling, printable)
      drawNeighbours(content, page, context, printable)
      for (const match of page.marks) drawMark(content, match, page.window, margin)
      drawName(content, page, { ...context, items }, printable)
    }),
  )
}

/**
 * Left and top are trimmed and laid over the neighbour; right and bottom are laid under, up to the dashed line. Where sheets are
 * taped edge to edge, all four are trimmed. A side without neighbour shows where the printable area ends.
 */
function drawSides(content: PageContent, page: TilePage, tiling: Tiling, printable: PageWindow): void {
  const half = tiling.overlap / 2
  const right = printable.x + printable.width
  const bottom = printable.y + printable.height
  const joined = new Set(page.marks.map((match) => match.side))
  const under = tiling.join === 'butt' ? trim : lay
  const upright = (x: number, style: Style) => content.line({ x, y: printable.y }, { x, y: bottom }, style)
  const level = (y: number, style: Style) => content.line({ x: printable.x, y }, { x: right, y }, style)
  if (joined.has('left')) upright(printable.x + half, trim)
  else upright(printable.x + inset, hairline)
  if (joined.has('right')) upright(right - half, under)
  else upright(right - inset, hairline)
  if (joined.has('top')) level(printable.y + half, trim)
  else level(printable.y + inset, hairline)
  if (joined.has('bottom')) level(bottom - half, under)
  else level(bottom - inset, hairline)
}

/** Which sheet lies beyond each edge, written where it is cut off or covered once the sheets are taped. */
function drawNeighbours(
  content: PageContent,
  page: TilePage,
  { tiling, sheets }: TileContext,
  printable: PageWindow,
): void {
  const strip = tiling.overlap / 2
  const middle = { x: printable.x + printable.width / 2, y: printable.y + printable.height / 2 }
  const right = printable.x + printable.width
  const bottom = printable.y + printable.height
  const baseline = strip / 2 + 1
  const beyond = [
    { row: -1, column: 0, sign: '↑', turn: 0, at: { x: middle.x, y: printable.y + baseline } },
    { row: 1, column: 0, sign: '↓', turn: 0, at: { x: middle.x, y: bottom - strip + baseline } },
    { row: 0, column: -1, sign: '↑', turn: -90, at: { x: printable.x + baseline, y: middle.y } },
    { row: 0, column: 1, sign: '↑', turn: 90, at: { x: right - baseline, y: middle.y } },
  ]
  for (const { row, column, sign, turn, at } of beyond) {
    const name = pageName(page.row + row, page.column + column)
    if (!sheets.has(name)) continue
    content.text(`${sign}${name}`, at, { size: 3, align: 'middle', dye: 'walnut', turn })
  }
}

/** A circle and a cross; its name stands beside it, on the side that stays visible on the lower sheet as well. */
function drawMark(content: PageContent, match: MatchMark, window: PageWindow, margin: number): void {
  const at = { x: match.at.x - window.x + margin, y: match.at.y - window.y + margin }
  content.stamp('Mark', at)
  const upright = match.side === 'left' || match.side === 'right'
  const size = 3
  // Once on either side of the join: one is cut off or covered, the other is read.
  for (const side of [-1, 1]) {
    const text = upright ? { x: at.x + side * 3.2, y: at.y + 8 } : { x: at.x + 7.2, y: at.y + side * 2.6 + 1 }
    content.text(match.name, text, { size, weight: 600, align: 'middle' })
  }
}

/** The page's name, the map and the caption, in the corner where they hide least. */
function drawName(content: PageContent, page: TilePage, context: TileContext, printable: PageWindow): void {
  const { tiling } = context
  const map = mapSize(tiling, mapRoom)
  const box = { width: map.width + 3 + captionWidth, height: Math.max(map.height, 19) }
  const clear = tiling.overlap / 2 + 3
  const corners = [
    { x: clear, y: clear },
    { x: clear, y: printable.height - clear - box.height },
    { x: printable.width - clear - box.width, y: clear },
    { x: printable.width - clear - box.width, y: printable.height - clear - box.height },
    { x: (printable.width - box.width) / 2, y: clear },
    { x: (printable.width - box.width) / 2, y: (printable.height - box.height) / 2 },
  ]
  const crossed = (corner: { x: number; y: number }) => {
    const window = {
      x: page.window.x + corner.x - 1,
      y: page.window.y + corner.y - 1,
      width: box.width + 2,
      height: box.height + 2,
    }
    return context.items.filter(({ ink }) => crosses(ink, window)).length
  }
  const [first, ...others] = corners.map((corner) => ({ corner, crossed: crossed(corner) }))
  if (!first) return
  const { corner } = others.reduce((best, next) => (next.crossed < best.crossed ? next : best), first)
  const x = printable.x + corner.x
  const y = printable.y + corner.y
  content.stamp('Map', { x, y })
  lightCell(content, tiling, { x, y }, mapRoom, page)
  const text = x + map.width + 3
  content.text(page.name, { x: text, y: y + 6.4 }, { size: 8, weight: 600, dye: 'indigo' })
  content.text(
    `Sheet ${context.sheets.get(page.name) ?? 1} of ${context.sheets.size}`,
    { x: text, y: y + 10.6 },
    { size: 3, dye: 'walnut' },
  )
  content.lines(context.caption, { x: text, y: y + 14.4 }, 3.8, { size: 3, dye: 'walnut' })
}

/** Everything that a drawing's pages write besides the drawing itself, so that its characters can be looked up beforehand. */
export function textsOf(drawing: Drawing): readonly string[] {
  return drawing.items.flatMap((item) => (item.kind === 'text' ? [item.text] : []))
}

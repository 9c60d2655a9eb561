import 'server-only'
import type { Drawing, DrawingItem, Path, Segment } from '@/drafting/contract'
import { crosses, inkOf, styleOf } from '@/drafting/drawing'
import type { Ink, PageWindow } from '@/drafting/drawing'
import { segmentLength } from '@/drafting/geometry/segment'
import type { PageContent } from './page-content'
import { pdfLayerOf } from './pdf-layers'
import type { PdfLayer } from './pdf-layers'

/** An item with what is needed to know quickly which pages it is on. */
export interface Placed {
  readonly item: DrawingItem
  readonly ink: Ink
  /** Of a path: the boxes of its segments, widened by the line, and how far along the path each begins. */
  readonly segments: readonly {
    readonly segment: Segment
    readonly box: PageWindow
    readonly start: number
  }[]
}

/** A drawing made ready for being drawn page by page. */
export function placedItems(drawing: Drawing): readonly Placed[] {
  return drawing.items.map((item) => ({
    item,
    ink: inkOf(item),
    segments: item.kind === 'path' ? measured(item.path, styleOf(item.style).width ?? 0) : [],
  }))
}

function measured(path: Path, width: number): Placed['segments'] {
  let start = 0
  return path.segments.map((segment) => {
    const box = hull(segment, width / 2)
    const entry = { segment, box, start }
    start += segmentLength(segment)
    return entry
  })
}

/** The box around a segment's control points, in which the whole curve lies. */
function hull(segment: Segment, around: number): PageWindow {
  const points =
    segment.kind === 'line'
      ? [segment.from, segment.to]
      : [segment.from, segment.control1, segment.control2, segment.to]
  const x = Math.min(...points.map((point) => point.x)) - around
  const y = Math.min(...points.map((point) => point.y)) - around
  return {
    x,
    y,
    width: Math.max(...points.map((point) => point.x)) + around - x,
    height: Math.max(...points.map((point) => point.y)) + around - y,
  }
}

/** The items that reach into a window, or to within a line's width of it. */
export function itemsIn(items: readonly Placed[], window: PageWindow): readonly Placed[] {
  const wider = { x: window.x - 1, y: window.y - 1, width: window.width + 2, height: window.height + 2 }
  return items.filter(({ ink }) => crosses(ink, wider))
}

/** Draws what lies in a window: of each line only the segments that reach into it, their dashes running on unbroken. */
export function drawItems(content: PageContent, items: readonly Placed[], window: PageWindow): void {
  for (const run of runsByLayer(items)) {
    content.on(run.layer, () => run.items.forEach((placed) => drawItem(content, placed, window)))
  }
}

/** Neighbours in the drawing's order that belong to one layer of the document. */
function runsByLayer(items: readonly Placed[]): readonly { layer: PdfLayer; items: readonly Placed[] }[] {
  const runs: { layer: PdfLayer; items: Placed[] }[] = []
  for (const placed of items) {
    const layer = pdfLayerOf(placed.item.layer)
    const last = runs.at(-1)
    if (last?.layer === layer) last.items.push(placed)
    else runs.push({ layer, items: [placed] })
  }
  return runs
}

function drawItem(content: PageContent, placed: Placed, window: PageWindow): void {
  const { item } = placed
  const style = styleOf(item.style)
  if (item.kind === 'text') {
    content.text(item.text, item.at, {
      size: item.size,
      weight: style.weight ?? 400,
      dye: style.fill ?? 'ink',
      turn: item.turn,
      align: 'middle',
    })
  } else if (style.fill) content.path(item.path, style)
  else drawLine(content, placed, window)
}

function drawLine(content: PageContent, placed: Placed, window: PageWindow): void {
  const { item, segments } = placed
  if (item.kind !== 'path') return
  const style = styleOf(item.style)
  const inside = segments.filter(({ box }) => meet(box, window))
  if (inside.length === segments.length) return content.path(item.path, style)
  const round = style.dash?.reduce((sum, length) => sum + length, 0) ?? 0
  let run: typeof inside = []
  const flush = () => {
    const first = run[0]
    if (first) {
      const path: Path = { segments: run.map(({ segment }) => segment), closed: false }
      content.path(path, style, round > 0 ? first.start % round : 0)
    }
    run = []
  }
  for (const entry of inside) {
    const last = run.at(-1)
    if (last && !follows(last.segment, entry.segment)) flush()
    run.push(entry)
  }
  flush()
}

function follows(before: Segment, after: Segment): boolean {
  return before.to.x === after.from.x && before.to.y === after.from.y
}

function meet(a: PageWindow, b: PageWindow): boolean {
  return a.x <= b.x + b.width && b.x <= a.x + a.width && a.y <= b.y + b.height && b.y <= a.y + a.height
}

import type { Drawing, DrawingItem, Point } from '../contract'
import { boundsOf } from './bounds'
import { crosses, encloses, inkOf, inkOfPoints } from './crossing'
import type { PageWindow } from './crossing'
import type { TilePage, Tiling } from './tiling'

/** Clear of the join, and of the lines of the piece, mm. */
const clearance = 2

/**
 * Moves the label of a piece off the joins between sheets, where it fits beside them within its piece. One that is larger than
 * what a sheet shows, or that finds no room, stays.
 *
 * @param outlines what each piece is cut along, by its id, as points.
 */
export function labelsOffJoins(
  drawing: Drawing,
  tiling: Tiling,
  outlines: ReadonlyMap<string, readonly Point[]>,
): Drawing {
  const joins = joinsOf(tiling)
  const moves = new Map<string, Point>()
  for (const [piece, outline] of outlines) {
    const own = drawing.items.filter((item) => item.piece === piece)
    const label = own.filter((item) => item.layer === 'label')
    if (label.length === 0) continue
    const move = moveFor(
      boxOf(label),
      joins,
      outline,
      own.filter((item) => item.layer !== 'label'),
    )
    if (move) moves.set(piece, move)
  }
  if (moves.size === 0) return drawing
  const items = drawing.items.map((item) => moved(item, moves))
  return { ...drawing, items }
}

function moved(item: DrawingItem, moves: ReadonlyMap<string, Point>): DrawingItem {
  const move = item.layer === 'label' && item.piece ? moves.get(item.piece) : undefined
  if (!move || item.kind !== 'text') return item
  return { ...item, at: { x: item.at.x + move.x, y: item.at.y + move.y } }
}

/** Where the sheets are cut: the middles of the overlaps. */
function joinsOf(tiling: Tiling): { readonly x: readonly number[]; readonly y: readonly number[] } {
  const half = tiling.overlap / 2
  const starts = (index: 'row' | 'column', of: (page: TilePage) => number) => [
    ...new Set(tiling.pages.filter((page) => page[index] > 0).map((page) => of(page) + half)),
  ]
  return {
    x: starts('column', ({ window }) => window.x),
    y: starts('row', ({ window }) => window.y),
  }
}

function boxOf(items: readonly DrawingItem[]): PageWindow {
  const { min, max } = boundsOf(items)
  return { x: min.x, y: min.y, width: max.x - min.x, height: max.y - min.y }
}

/** The shortest move that brings a box clear of all joins and keeps it within the piece; null when none is needed or found. */
function moveFor(
  box: PageWindow,
  joins: { readonly x: readonly number[]; readonly y: readonly number[] },
  outline: readonly Point[],
  lines: readonly DrawingItem[],
): Point | null {
  const across = shifts(box.x, box.width, joins.x)
  const down = shifts(box.y, box.height, joins.y)
  if (across.length === 1 && down.length === 1) return null
  const inks = [inkOfPoints(outline, false), ...lines.map(inkOf)]
  const fits = (move: Point) => {
    const window = {
      x: box.x + move.x - clearance,
      y: box.y + move.y - clearance,
      width: box.width + 2 * clearance,
      height: box.height + 2 * clearance,
    }
    const middle = { x: window.x + window.width / 2, y: window.y + window.height / 2 }
    return encloses(outline, middle) && !inks.some((ink) => crosses({ ...ink, region: false }, window))
  }
  const clear = (at: number, size: number, all: readonly number[]) =>
    all.every((join) => join <= at - clearance || join >= at + size + clearance)
  return (
    across
      .flatMap((x) => down.map((y) => ({ x, y })))
      .filter(({ x, y }) => clear(box.x + x, box.width, joins.x) && clear(box.y + y, box.height, joins.y))
      .sort((a, b) => Math.hypot(a.x, a.y) - Math.hypot(b.x, b.y))
      .find(fits) ?? null
  )
}

/** Moves to be tried in one direction: none, and to either side of each join in reach, once and twice over. */
function shifts(at: number, size: number, joins: readonly number[]): readonly number[] {
  const hit = joins.filter((join) => join > at - clearance && join < at + size + clearance)
  const aside = hit.flatMap((join) => [join - clearance - size - at, join + clearance - at])
  return [0, ...aside]
}

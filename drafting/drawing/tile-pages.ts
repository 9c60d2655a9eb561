import type { Drawing, Point } from '../contract'
import { inkOf, inkOfPoints } from './crossing'
import type { Ink } from './crossing'
import { inkedCells } from './inked-cells'
import { matchMarks } from './match-marks'
import { corner } from './page-grid'
import type { PageGrid } from './page-grid'
import type { TileOptions, TilePage, Tiling } from './tiling'

/** Places of the grid that are tried within its slack: fewer pages may be needed when it is moved a little. */
const shifts = [0.5, 0, 0.25, 0.75, 1]

/**
 * Cuts a drawing into pages. Neighbours overlap and are trimmed along the middle of the overlap; each page answers for what lies
 * within its trimmed edges, and is blank when nothing does. Blank pages are listed, not printed.
 */
export function tilePages(drawing: Drawing, options: TileOptions): Tiling {
  const wanted = options.orientation ?? 'fewest'
  const ways = wanted === 'fewest' ? (['portrait', 'landscape'] as const) : [wanted]
  const inks = inksOf(drawing, options.regions ?? [])
  const tried = ways.map((way) => tile(drawing, inks, options, way))
  return tried.reduce((best, next) => (printed(next) < printed(best) ? next : best))
}

const printed = (tiling: Tiling) => tiling.pages.filter((page) => !page.blank).length

function inksOf(drawing: Drawing, regions: readonly (readonly Point[])[]): readonly Ink[] {
  return [...drawing.items.map(inkOf), ...regions.map((region) => inkOfPoints(region, true))]
}

function tile(
  drawing: Drawing,
  inks: readonly Ink[],
  options: TileOptions,
  orientation: 'portrait' | 'landscape',
): Tiling {
  const margin = options.margin ?? 10
  const overlap = options.overlap ?? 12
  const { width: short, height: long } = options.paper
  const width = orientation === 'portrait' ? short : long
  const height = orientation === 'portrait' ? long : short
  const printable = { width: width - 2 * margin, height: height - 2 * margin }
  const grid = bestGrid(drawing, inks, printable, overlap)
  const { cells } = inkedCells(grid, inks)
  const pages = cells.map((inked, index): TilePage => {
    const row = Math.floor(index / grid.columns)
    const column = index % grid.columns
    return {
      name: pageName(row, column),
      row,
      column,
      window: { ...corner(grid, row, column), ...printable },
      blank: !inked,
      marks: [],
    }
  })
  const marks = matchMarks(pages, overlap)
  return {
    pages: pages.map((page) => ({ ...page, marks: marks.get(page.name) ?? [] })),
    rows: grid.rows,
    columns: grid.columns,
    orientation,
    width,
    height,
    margin,
    overlap,
    join: options.join ?? 'trim',
  }
}

/** 'A1', 'B12'; after row Z comes AA. */
export function pageName(row: number, column: number): string {
  const letter = (index: number): string =>
    (index >= 26 ? letter(Math.floor(index / 26) - 1) : '') + String.fromCharCode(65 + (index % 26))
  return `${letter(row)}${column + 1}`
}

function bestGrid(
  drawing: Drawing,
  inks: readonly Ink[],
  printable: { width: number; height: number },
  overlap: number,
): PageGrid {
  const { min, max } = drawing.bounds
  const step = { x: printable.width - overlap, y: printable.height - overlap }
  // Half a heaviest line of room on every side.
  const wide = max.x - min.x + 1
  const high = max.y - min.y + 1
  const columns = Math.max(1, Math.ceil((wide - overlap) / step.x))
  const rows = Math.max(1, Math.ceil((high - overlap) / step.y))
  const slack = { x: columns * step.x + overlap - wide, y: rows * step.y + overlap - high }
  let best: { grid: PageGrid; count: number } | null = null
  for (const down of shifts) {
    for (const across of shifts) {
      const origin = { x: min.x - 0.5 - slack.x * across, y: min.y - 0.5 - slack.y * down }
      const grid = { origin, rows, columns, printable, step, overlap }
      const count = inkedCells(grid, inks).count
      if (!best || count < best.count) best = { grid, count }
    }
  }
  return best ? best.grid : { origin: min, rows, columns, printable, step, overlap }
}

import type { Point } from '../contract'
import { encloses, strokeCrosses } from './crossing'
import type { Ink } from './crossing'
import { cell, columnAt, rowAt } from './page-grid'
import type { PageGrid } from './page-grid'

/** Which cells of a net of pages anything is drawn in, row by row; and how many. */
export interface InkedCells {
  readonly cells: readonly boolean[]
  readonly count: number
}

/** Walks every stroke once: most begin and end in one cell, which then holds all of them. */
export function inkedCells(grid: PageGrid, inks: readonly Ink[]): InkedCells {
  const cells = new Array<boolean>(grid.rows * grid.columns).fill(false)
  for (const ink of inks) {
    for (let index = 1; index < ink.points.length; index += 1) {
      const from = ink.points[index - 1]
      const to = ink.points[index]
      if (from && to) inkStroke(grid, cells, from, to)
    }
    if (ink.region) inkInside(grid, cells, ink)
  }
  return { cells, count: cells.filter(Boolean).length }
}

function inkStroke(grid: PageGrid, cells: boolean[], from: Point, to: Point): void {
  const rows = [rowAt(grid, from.y), rowAt(grid, to.y)] as const
  const columns = [columnAt(grid, from.x), columnAt(grid, to.x)] as const
  if (rows[0] === rows[1] && columns[0] === columns[1]) {
    cells[rows[0] * grid.columns + columns[0]] = true
    return
  }
  for (let row = Math.min(...rows); row <= Math.max(...rows); row += 1) {
    for (let column = Math.min(...columns); column <= Math.max(...columns); column += 1) {
      const at = row * grid.columns + column
      if (!cells[at] && strokeCrosses(from, to, cell(grid, row, column))) cells[at] = true
    }
  }
}

/** Cells wholly inside a region are crossed by none of its strokes: their middles tell. */
function inkInside(grid: PageGrid, cells: boolean[], ink: Ink): void {
  for (let row = rowAt(grid, ink.min.y); row <= rowAt(grid, ink.max.y); row += 1) {
    for (let column = columnAt(grid, ink.min.x); column <= columnAt(grid, ink.max.x); column += 1) {
      const at = row * grid.columns + column
      if (cells[at]) continue
      const { x, y, width, height } = cell(grid, row, column)
      if (encloses(ink.points, { x: x + width / 2, y: y + height / 2 })) cells[at] = true
    }
  }
}

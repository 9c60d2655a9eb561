import type { Point } from '../contract'
import type { PageWindow } from './crossing'

/** A net of pages over a drawing. A cell is what its page answers for: from trim line to trim line, the outermost to the end of their page. */
export interface PageGrid {
  readonly origin: Point
  readonly rows: number
  readonly columns: number
  readonly printable: { readonly width: number; readonly height: number }
  readonly step: { readonly x: number; readonly y: number }
  readonly overlap: number
}

/** Upper left corner of what a page shows. */
export function corner(grid: PageGrid, row: number, column: number): Point {
  return { x: grid.origin.x + column * grid.step.x, y: grid.origin.y + row * grid.step.y }
}

/** Row of the cell that holds a height, clamped to the net. */
export function rowAt(grid: PageGrid, y: number): number {
  const row = Math.floor((y - grid.origin.y - grid.overlap / 2) / grid.step.y)
  return Math.min(grid.rows - 1, Math.max(0, row))
}

/** Column of the cell that holds a breadth, clamped to the net. */
export function columnAt(grid: PageGrid, x: number): number {
  const column = Math.floor((x - grid.origin.x - grid.overlap / 2) / grid.step.x)
  return Math.min(grid.columns - 1, Math.max(0, column))
}

/** What the page of a row and column answers for. */
export function cell(grid: PageGrid, row: number, column: number): PageWindow {
  const { x, y } = corner(grid, row, column)
  const half = grid.overlap / 2
  const left = column === 0 ? x : x + half
  const top = row === 0 ? y : y + half
  const right = x + grid.printable.width - (column === grid.columns - 1 ? 0 : half)
  const bottom = y + grid.printable.height - (row === grid.rows - 1 ? 0 : half)
  return { x: left, y: top, width: right - left, height: bottom - top }
}

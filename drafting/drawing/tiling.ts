import type { Point } from '../contract'
import type { PageWindow } from './crossing'
import type { Paper } from './papers'

/** A mark that two neighbours both carry: laid on each other, the pages are taped true. */
export interface MatchMark {
  /** The same on both pages: a number for the edge, a letter for the mark on it. */
  readonly name: string
  readonly at: Point
  readonly side: 'left' | 'right' | 'top' | 'bottom'
}

/**
 * How neighbours meet: 'trim' cuts one of two along its solid line and lays it over the other; 'butt' cuts both along the same
 * line and tapes them edge to edge, so that no join is thicker than one sheet.
 */
export type Join = 'trim' | 'butt'

export type Orientation = 'portrait' | 'landscape' | 'fewest'

export interface TileOptions {
  readonly paper: Paper
  /** 'fewest' takes whichever way needs fewer pages. Default 'fewest'. */
  readonly orientation?: Orientation
  /** Safe edge: nothing is drawn nearer to the edge of the paper, mm. Default 10. */
  readonly margin?: number
  /** How far neighbours show the same, mm. Default 12. */
  readonly overlap?: number
  /** See Join. Default 'trim'. */
  readonly join?: Join
  /** Outlines of pieces: a page that lies wholly inside one is needed to hold the others together, though nothing is drawn on it. */
  readonly regions?: readonly (readonly Point[])[]
}

export interface TilePage {
  /** 'B3': row B, third column. */
  readonly name: string
  readonly row: number
  readonly column: number
  /** What the printable area shows of the drawing, overlap included. */
  readonly window: PageWindow
  readonly blank: boolean
  /** In the drawing's frame. */
  readonly marks: readonly MatchMark[]
}

export interface Tiling {
  readonly pages: readonly TilePage[]
  readonly rows: number
  readonly columns: number
  readonly orientation: 'portrait' | 'landscape'
  /** Of the paper as it is turned, mm. */
  readonly width: number
  readonly height: number
  readonly margin: number
  readonly overlap: number
  readonly join: Join
}

import type { Corner, Edge, EdgeRole, Mark, Path, Point, Step } from '../contract'
import type { Mask } from './masks'

/** A mark with what each of its coordinates depends on. */
export interface PenMark {
  readonly id: string
  readonly at: Point
  readonly x: Mask
  readonly y: Mask
}

/** An edge as drawn, before its allowance is added. */
export interface DrawnEdge {
  readonly id: string
  readonly role: EdgeRole
  readonly finish: Edge['finish']
  readonly path: Path
  readonly allowance: number
  readonly startCorner: Corner
  readonly madeBy: string
  readonly uses: Mask
}

/** What is said of an edge when it is drawn. */
export interface EdgeOptions {
  readonly role: EdgeRole
  /** Style value that gives the allowance; none on a fold. */
  readonly allowance?: string
  readonly corner?: Corner
  readonly finish?: Edge['finish']
  readonly say: string
  /** Names and marks it follows from, beside its own ends. */
  readonly uses?: readonly string[]
  readonly through?: readonly string[]
  readonly mask?: Mask
  readonly kind?: Step['kind']
}

/** What is said of a mark when it is placed. */
export interface MarkOptions {
  /** Which way a tape rounds it, where the nearest would do harm: a girth must not come out too small. */
  readonly round?: 'up' | 'down'
  readonly stepKind?: Step['kind']
  readonly say: string
  readonly kind?: Mark['kind']
  /** Style values that dragging this mark changes, one or two. */
  readonly drag?: readonly string[]
  /** Sewn neighbours hold the same mark in the same place, so a correction of one moves all of them. */
  readonly shared?: boolean
  /** Names that it follows from beside its own length: what would move it from some value on, though it adds nothing now. */
  readonly also?: readonly string[]
  /** It stands on the centre line, so a correction moves it up and down only. */
  readonly onCentre?: boolean
  /** Why no correction can move it, and what to correct instead. */
  readonly fixed?: string
  /** The end of a seam that has a length to keep: however it or the other end is moved, it stays so far, mm, from that point. */
  readonly keeps?: { readonly from: Point; readonly length: number }
}

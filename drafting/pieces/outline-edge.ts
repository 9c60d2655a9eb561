import type { Corner, Dart, Edge, EdgeRole, Path, Point } from '../contract'

/** What the cut line needs to know of an edge. The edges in order make the closed stitch line, clockwise. */
export interface OutlineEdge {
  readonly id: string
  readonly role: EdgeRole
  readonly path: Path
  /** mm; 0 on a fold. */
  readonly allowance: number
  readonly startCorner: Corner
  /** A turned edge counts as a hem at a turned corner. */
  readonly finish?: Edge['finish']
}

/** What the cut line needs to know of a dart on an edge. */
export type OutlineDart = Pick<Dart, 'edges' | 'pressTo'>

/** An edge with its parallel, ready for its corners. */
export interface Side {
  readonly edge: OutlineEdge
  /** Effective allowance, mm ≥ 0. */
  readonly allowance: number
  /** The stitch edge moved out by its allowance, loops cut away. */
  readonly offset: Path
  /** Whether the edge bends tighter than its allowance somewhere. */
  readonly tight: boolean
  /** Where the offset starts and ends, and which way it runs there. */
  readonly start: Point
  readonly end: Point
  readonly leaving: Point
  readonly arriving: Point
}

/**
 * How the cut line passes from one side to the next. Distances are mm along the offsets; undefined is the offset's own end.
 * From where it leaves the first it runs straight to the joint, where the next edge's own cut begins; `lead` goes from there
 * to where the second offset is entered.
 */
export interface Turn {
  readonly joint: Point
  readonly leave?: number
  readonly lead: readonly Path['segments'][number][]
  readonly enter?: number
  /** An allowance that could not be kept here. */
  readonly failed?: boolean
}

/** A mitre reaches at most so many times the larger allowance from its corner. */
export const MITRE_LIMIT = 2.5

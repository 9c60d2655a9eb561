import type { Unit } from '../contract'
import type { Layer } from './layers'

/** Where a piece lies: its own frame turned about its origin (degrees, clockwise on screen), then moved (mm). */
export interface Place {
  readonly x: number
  readonly y: number
  readonly turn?: number
}

export type Places = Readonly<Record<string, Place>>

/** What every piece's label says besides the piece itself. */
export interface TitleBlock {
  readonly name: string
  readonly version?: string
  /** As it is to be read. */
  readonly date?: string
}

export interface DrawingOptions {
  /** Default: all that a finished pattern shows. */
  readonly layers?: readonly Layer[]
  /** false draws the nett pattern: stitch lines as the outline, no cut lines. Default true. */
  readonly allowances?: boolean
  /** Default: arrange(draft). */
  readonly places?: Places
  /** Of the lengths on dimension lines. Default 'cm'. */
  readonly unit?: Unit
  readonly title?: TitleBlock
  /** Texts so many times their size on paper, where a drawing is shown small. Default 1. */
  readonly textScale?: number
}

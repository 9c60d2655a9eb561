import type { DesignValue, RuleDefinition } from '../../contract'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import type { Armhole } from './armhole'

/** A sleeve that a style may have: what may be chosen about it, its rules, and how it is drawn. */
export interface Sleeve {
  readonly design: readonly DesignValue[]
  readonly rules: readonly RuleDefinition[]
  /** Whether its hem is turned up; otherwise a band or a cuff finishes it. */
  readonly turnedUp: boolean
  /** Draws it into the armholes of a front and a back. */
  readonly draw: (pen: Pen, front: Armhole, back: Armhole) => void
}

/** Lengths of the two halves of a sleeve head, or of what belongs to them, mm. */
export interface Halves {
  readonly front: number
  readonly back: number
}

/** Ids of the marks that the outline of a sleeve is drawn between. */
export interface SleeveCorners {
  readonly crown: string
  readonly front: string
  readonly back: string
  readonly frontHem: string
  readonly backHem: string
}

/** What makes one kind of set-in sleeve out of the straight sleeve that every kind starts from. */
export interface SetInKind {
  /** Style value or rule that gives its length from the crown. */
  readonly length: string
  /** Style value that shortens or lengthens it. */
  readonly lengthField: string
  /** Rules that give what is eased or gathered into the front and the back of the armhole. */
  readonly ease: { readonly front: string; readonly back: string }
  readonly join: 'eased' | 'gathered'
  /** The hem: one sweep from seam to seam, a bow through the middle, or gathered: dropped in the middle, dipped at the back. */
  readonly hem: 'sweep' | 'bow' | 'gathered' | 'dipped'
  /** The style value to change where its shape cannot be drawn, and what to say. */
  readonly blame: { readonly field: string; readonly head: string; readonly hem: string }
  /**
   * Marks its corners.
   *
   * @param head lengths of the halves of the straight sleeve's head, mm.
   */
  readonly corners: (pen: Pen, sleeve: PiecePen, head: Halves) => SleeveCorners
  /** Draws what is sewn to its hem. */
  readonly finish?: (pen: Pen, sleeve: PiecePen) => void
}

/** The ease of a head that is set in smooth. */
export const smoothEase = { front: 'frontHeadEase', back: 'backHeadEase' } as const

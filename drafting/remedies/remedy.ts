import type { RemedyDefinition } from '../contract'

/** What one millimetre of a remedy does. */
export type Change =
  /** Raises a rule by so much: mm or degrees, as the rule is. */
  | { readonly rule: string; readonly per: number }
  /** Raises a style value by so much. */
  | { readonly style: string; readonly per: number }
  /** Moves a mark. */
  | {
      readonly piece: string
      readonly mark: string
      readonly per: { readonly x: number; readonly y: number }
    }

/** One way of carrying a remedy out, for garments that have all the rules and style values it names. */
export interface Way {
  /** Rules that a garment must have beside those that are changed. */
  readonly needs?: readonly string[]
  readonly changes: readonly Change[]
}

/** A remedy as it is written down. All ways that fit a garment are taken together. */
export interface Remedy extends Omit<RemedyDefinition, 'garments'> {
  readonly ways: readonly Way[]
  /** What the draft must have, or the remedy would change nothing. */
  readonly where?: { readonly style: string; readonly not: string; readonly message: string }
}

/** Degrees by which a shoulder of 12.5 cm turns for each mm at its tip. */
export const shoulderTurn = 180 / Math.PI / 125

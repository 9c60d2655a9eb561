import type { DesignValue, RuleDefinition, Run } from '../../contract'
import type { Garment } from '../../pen/garment'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'

/** Half the waist of a bodice, its darts closed, mm. */
export interface UpperHalf {
  readonly length: number
  /** From the centre to each dart or seam that ends at it. */
  readonly joints: readonly number[]
}

/** The waist that a skirt is sewn to, and what it follows from. */
export interface SewnTo {
  readonly front: UpperHalf
  readonly back: UpperHalf
  readonly uses: Mask
}

/** How a garment uses a skirt: by itself on a waistband or bound, or sewn to the waist of a bodice. */
export interface SkirtUse {
  /** Stands before the ids of its pieces and seams, so that they are not the bodice's. */
  readonly prefix: '' | 'skirt-'
  readonly opening: string
  /** The length that says how far the zip comes down from the waist. */
  readonly zip: string
  /** Level on the body of the skirt's waist, mm: where corrections count from the side neck. */
  readonly origin: number
  readonly sewnTo?: SewnTo
  /** Too short for pockets and zip, its waist edge left for what it is sewn to: a peplum. */
  readonly peplum?: boolean
}

/** A place along the whole waist that has a partner on the bodice: a side, a centre, a dart. */
export interface WaistPlace {
  readonly key: string
  /** mm from the centre back. */
  readonly at: number
}

/** What a drawn skirt hands to what it is sewn to: its waist from the centre back once round. */
export interface DrawnSkirt {
  readonly waist: readonly Run[]
  readonly places: readonly WaistPlace[]
}

/** A kind of skirt, as garments and dresses take it. */
export interface Skirt {
  readonly name: string
  readonly needs: readonly string[]
  readonly estimates: readonly string[]
  readonly design: readonly DesignValue[]
  readonly rules: readonly RuleDefinition[]
  readonly found: Garment['found']
  /** Draws its pieces, seams, fits and tags, with a waistband where it is worn by itself and the style has one. */
  readonly draw: (pen: Pen, use: SkirtUse) => DrawnSkirt
}

/** What to do about the waist of a skirt that is sewn to a bodice. */
export const sewnToBodice = 'At the waist take in the side of the bodice: the skirt follows it.'

/** A skirt worn by itself. */
export const alone = (pen: Pen): SkirtUse => ({
  prefix: '',
  opening: String(pen.chosen('opening')),
  zip: 'zipLength',
  origin: 0,
})

/** Begins a piece of a skirt. */
export function skirtPiece(
  pen: Pen,
  { prefix }: SkirtUse,
  id: string,
  name: string,
  fixed?: string,
): PiecePen {
  return pen.piece(`${prefix}${id}`, prefix ? `Skirt ${name.toLowerCase()}` : name, fixed)
}

/** What becomes of the waist edge: sewn to a band or a bodice, or bound. */
export const waistFinish = (pen: Pen, use: SkirtUse): 'seam' | 'bound' =>
  !use.peplum && (use.sewnTo || pen.chosen('waistband')) ? 'seam' : 'bound'

/** Whether the centre back lies on the fold. */
export const backOnFold = (use: SkirtUse): boolean =>
  use.opening !== 'centre-back zip' && use.opening !== 'open centre back'

/** Whether the hip lies on the skirt, so that it can be measured there. */
export const reachesHip = (pen: Pen): boolean => pen.value('hipLine') < pen.length('length') - 10

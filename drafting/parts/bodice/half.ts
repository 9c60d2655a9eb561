import type { Mask } from '../../pen/masks'
import type { PiecePen } from '../../pen/piece-pen'
import type { Faced } from '../facing'
import type { Centre } from '../openings/opening'
import type { Armhole } from '../sleeves/armhole'
import { dartAngle, type WaistDart } from '../waist-darts'
import type { DrawnHalf } from './panels'

/** A drawn half of a bodice, and what the other pieces need of it. */
export interface BodiceHalf extends DrawnHalf {
  /** The half with its darts closed, as facings are traced from it. */
  readonly faced: Faced
  /** How its centre ends. */
  readonly centre: Centre
}

/** How a neckline leaves the side neck, degrees from the vertical inwards, and what that follows from. */
export interface Lean {
  readonly degrees: number
  readonly uses: Mask
}

/**
 * Marks the points of the darts at a waist; where a correction moves one, its dart goes along and keeps its width.
 *
 * @param waist y of the waist at the dart, mm.
 */
export function placeWaistTips(
  piece: PiecePen,
  darts: readonly WaistDart[],
  waist: number,
  uses: Mask,
): readonly WaistDart[] {
  return darts.map((dart, index) => {
    const id = `waistDart${index + 1}Point`
    piece.place(id, dart.point, { say: 'Mark the point of the waist dart', mask: uses })
    const point = piece.at(id)
    if (point === dart.point) return dart
    const wide = 2 * Math.sin((dart.angle * Math.PI) / 360) * (waist - dart.point.y)
    return { ...dart, point, angle: dartAngle(wide, waist - point.y) }
  })
}

/** The grain of a half beside its centre: from the underarm, or below a deep neckline, down to the waist. */
export function grainBesideCentre(piece: PiecePen): void {
  const top = Math.max(piece.at('scyeLevel').y, piece.at('centreNeck').y + 15)
  piece.grain({ x: 35, y: top }, { x: 35, y: piece.at('centreWaist').y - 25 })
}

/** The armhole of a half from the shoulder to the underarm, over all its panels. */
export function armholeOf(half: BodiceHalf): Armhole {
  return half.runs('armhole').map(({ piece, edge }) => {
    const drawn = half.pieces.find(({ id }) => id === piece)
    if (!drawn) throw new Error(`The bodice has no piece “${piece}”.`)
    return { piece: drawn, edge }
  })
}

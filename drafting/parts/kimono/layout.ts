import type { Point } from '../../contract'
import { add, dot, scale, subtract, towards, unit } from '../../geometry'
import { solveBetween } from '../../pen/solve'

/** What the shape of a kimono sleeve follows from; mm, degrees. */
export interface KimonoSizes {
  readonly neckWidth: number
  readonly slope: number
  /** From the neck point along shoulder and sleeve to the hem of the sleeve. */
  readonly overarm: number
  readonly mouth: number
  readonly quarter: number
  readonly underarm: number
  /** How far from the corner under the arm the sleeve must stay clear: its rounding or its gusset. */
  readonly corner: number
  /** The steepest that the underside of the sleeve may fall away from the body, degrees. */
  readonly steepest: number
}

export interface KimonoLayout {
  /** The low end of the sleeve's hem. */
  readonly wristLow: Point
  /** Girth of the sleeve where its straight part ends under the arm, mm. */
  readonly girth: number
  /** How much longer than needed to stay clear of the body; negative when it is too short, mm. */
  readonly clear: number
}

/** Lays out shoulder, sleeve and underarm of one half. The hem of the sleeve stands alike to its upper and its under side. */
export function kimonoLayout(sizes: KimonoSizes): KimonoLayout {
  const neck = { x: sizes.neckWidth, y: 0 }
  const along = towards(sizes.slope)
  const wristTop = add(neck, scale(along, sizes.overarm))
  const corner = { x: sizes.quarter, y: sizes.underarm }
  const lowFor = (middle: number): Point => add(wristTop, scale(towards(middle + 90), sizes.mouth))
  const fallTo = (low: Point): number => (Math.atan2(low.y - corner.y, low.x - corner.x) * 180) / Math.PI
  // The hem of the sleeve stands square to the line that halves the angle between its upper and its under side.
  const off = (middle: number): number => (sizes.slope + fallTo(lowFor(middle))) / 2 - middle
  // Where it would have to lean more than that the sleeve is too short, and `clear` says so.
  const most = (sizes.slope + sizes.steepest + 10) / 2
  const wristLow = lowFor(solveBetween(off, sizes.slope - 45, most, 1e-10) ?? most)
  const out = unit(subtract(wristLow, corner))
  const start = add(corner, scale(out, sizes.corner))
  const from = subtract(start, neck)
  const girth = 2 * dot(from, { x: -along.y, y: along.x })
  const run = wristLow.x - corner.x
  const fall = wristLow.y - corner.y
  const spare = Math.tan((sizes.steepest * Math.PI) / 180) * run - fall
  const ahead = sizes.overarm - dot(from, along) - 20
  const clear = Math.min(run - sizes.corner - 45, spare, ahead)
  return { wristLow, girth, clear }
}

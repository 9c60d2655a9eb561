import type { DraftOrder, GarmentDefinition } from '../contract'
import { DraftingError } from '../drafting-error'
import type { Garment } from '../pen/garment'
import { aLineSkirt } from './a-line-skirt'
import { bodice } from './bodice'
import { boxyBlouse } from './boxy-blouse'
import { circleSkirt } from './circle-skirt'
import { flaredDress } from './flared-dress'
import { gatheredSkirt } from './gathered-skirt'
import { goredSkirt } from './gored-skirt'
import { kaftan } from './kaftan'
import { peplum } from './peplum'
import { shiftDress } from './shift-dress'
import { straightSkirt } from './straight-skirt'
import { waistSeamDress } from './waist-seam-dress'

const all: readonly Garment[] = [
  flaredDress,
  shiftDress,
  circleSkirt,
  bodice,
  straightSkirt,
  aLineSkirt,
  goredSkirt,
  gatheredSkirt,
  kaftan,
  waistSeamDress,
  peplum,
  boxyBlouse,
]

/** Every garment that can be drafted. */
export const garments: readonly GarmentDefinition[] = all.map((garment) => garment.definition)

/** The garment that an order asks for. Throws DraftingError('unknown-garment'). */
export function findGarment(order: Pick<DraftOrder, 'garment'>): Garment {
  const garment = all.find((one) => one.definition.id === order?.garment)
  if (garment) return garment
  const asked: unknown = order?.garment
  const named =
    typeof asked === 'string' ? `There is no garment “${asked.slice(0, 60)}”.` : 'No garment is named.'
  const choices = all.map((one) => one.definition.id).join(', ')
  throw new DraftingError([
    { field: 'garment', code: 'unknown-garment', message: `${named} Choose one of ${choices}.` },
  ])
}

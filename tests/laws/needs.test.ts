import { describe, expect, it } from 'vitest'
import type { DraftOrder, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { honestNeeds, idleNeeds } from '../support/laws/law-15-honest-needs'
import { namedBodies } from '../support/laws/orders'

/** Named bodies in a style that goes over the head, so that each measurement can have its say. */
function orders(garment: GarmentDefinition): readonly DraftOrder[] {
  const pulledOn = garment.design.some((value) => value.id === 'backOpening')
  return namedBodies
    .filter((_, index) => index % 5 === 0)
    .map(({ card }) => ({
      garment: garment.id,
      measurements: card,
      ...(pulledOn ? { design: { backOpening: 'none' } } : {}),
    }))
}

describe.each(engine.garments.map((garment): [string, GarmentDefinition] => [garment.id, garment]))(
  'Law 15: a %s asks for what it uses and uses what it asks for',
  (_, garment) => {
    it('uses nothing that it does not declare, and asks for what it needs', () => {
      expect(orders(garment).flatMap((order) => honestNeeds(order, engine))).toEqual([])
    })

    it('declares nothing that changes no draft', () => {
      expect(idleNeeds(garment, orders(garment), engine)).toEqual([])
    })
  },
)

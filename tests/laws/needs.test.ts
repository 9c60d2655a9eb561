import { describe, expect, it } from 'vitest'
import type { DraftOrder, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { honestNeeds, idleNeeds } from '../support/laws/law-15-honest-needs'
import { namedBodies, tellingStyles } from '../support/laws/orders'

/** Named bodies in styles that between them ask for every measurement. */
function orders(garment: GarmentDefinition): readonly DraftOrder[] {
  return tellingStyles(garment).flatMap((design) =>
    namedBodies
      .filter((_, index) => index % 5 === 0)
      .map(({ card }) => ({ garment: garment.id, measurements: card, design })),
  )
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

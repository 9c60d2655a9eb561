import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DraftOrder, GarmentDefinition, RemedyDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { draftLaws } from '../support/laws/all'
import { fewer } from '../support/laws/hold'
import { cutLines } from '../support/laws/law-6-cut-lines'
import { fairCurves } from '../support/laws/law-14-fair-curves'
import { anyCard, anyStyle, namedBodies, namedOrders } from '../support/laws/orders'
import { attempt, drafted } from '../support/laws/redraft'
import type { Violation } from '../support/laws/violation'

/** How a line is offset and how fair it is stands in the files of those two laws; every other law is tried. */
const laws = draftLaws.filter((law) => law !== cutLines && law !== fairCurves)

const offers = engine.remedies.flatMap((remedy) =>
  remedy.garments.map((id) => ({
    id: remedy.id,
    garment: id,
    remedy,
    definition: engine.garments.find((one) => one.id === id) as GarmentDefinition,
  })),
)

/** A remedy for the arm needs a sleeve. */
function wearing(order: DraftOrder, { id }: RemedyDefinition): DraftOrder {
  return id === 'large-arm' && (order.design?.sleeve ?? 'none') === 'none'
    ? { ...order, design: { ...order.design, sleeve: 'plain' } }
    : order
}

function judged(order: DraftOrder): readonly Violation[] {
  const draft = drafted(order, engine)
  return draft ? laws.flatMap((law) => law(draft, order, engine)) : []
}

/**
 * Breaches of any law by an order with a remedy, judged as the plain order that it stands for. What the style breaks without
 * the remedy is no fault of the remedy's.
 */
function breaches(given: DraftOrder, remedy: RemedyDefinition, amount: number): readonly Violation[] {
  const order = wearing(given, remedy)
  const asked = { ...order, remedies: [{ id: remedy.id, amount }] }
  if (!drafted(asked, engine) || judged(order).length > 0) return []
  return judged(engine.withRemedies(asked))
}

describe.each(offers)('$id, $garment: laws hold at both ends of the range', ({ remedy, definition }) => {
  it('on published sizes and bodies at the edges', () => {
    // Every third: by rule and on a tape, at the least and at the most.
    const found = namedOrders(definition).flatMap(({ name, order }, index) => {
      if (index % 3 !== 0) return []
      const amount = index % 12 < 6 ? remedy.min : remedy.max
      return breaches(order, remedy, amount).map((one) => ({ body: name, ...one }))
    })
    expect(found).toEqual([])
  })

  it('on random bodies in random styles', () => {
    const order = fc.tuple(anyCard(definition), anyStyle(definition), fc.constantFrom(remedy.min, remedy.max))
    fc.assert(
      fc.property(order, ([measurements, design, amount]) => {
        expect(breaches({ garment: definition.id, measurements, design }, remedy, amount)).toEqual([])
      }),
      { numRuns: fewer(8), endOnFailure: true },
    )
  })

  it('hardly a body is refused for it', () => {
    const orders = namedBodies.flatMap(({ card }) =>
      [remedy.min, remedy.max].map((amount) => ({
        ...wearing({ garment: definition.id, measurements: card }, remedy),
        remedies: [{ id: remedy.id, amount }],
      })),
    )
    const refused = orders.filter(
      (order) =>
        attempt(order, engine) instanceof Error &&
        !(attempt({ ...order, remedies: [] }, engine) instanceof Error),
    )
    expect(refused.length / orders.length).toBeLessThanOrEqual(0.02)
  })
})

import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { draftLaws } from '../support/laws/all'
import { holdsForDrafts } from '../support/laws/hold'
import { cutLines } from '../support/laws/law-6-cut-lines'
import { fairCurves } from '../support/laws/law-14-fair-curves'
import { randomOrder } from '../support/laws/orders'
import { attempt } from '../support/laws/redraft'
import type { DraftLaw } from '../support/laws/violation'

/** Garments for which a built-in method has rules of its own; the others are drafted the same by all. */
const changing = engine.methods.flatMap((method) =>
  Object.entries(method.garments).map(([garment, rules]) => ({ id: method.id, garment, rules })),
)

/** What rules decide, all laws at once. How a line is offset and how fair it is stands in the files of those two laws. */
const ofRules = draftLaws.filter((law) => law !== cutLines && law !== fairCurves)
const everyLaw: DraftLaw = (...judged) => ofRules.flatMap((law) => law(...judged))

describe.each(changing)('drafted by the $id method', ({ id, garment, rules }) => {
  const definition = engine.garments.find((one) => one.id === garment) as GarmentDefinition

  describe('what is drafted sews together and closes on the body', () =>
    holdsForDrafts(everyLaw, {
      garments: [garment],
      change: (order) => ({ ...order, method: { id, rules } }),
      by: 2,
    }))

  it(`${garment}: at most one plausible body in a hundred is refused`, () => {
    const orders = fc.sample(randomOrder(definition), { numRuns: 300, seed: 4 })
    const refused = orders.filter(
      ({ design: _style, ...order }) => attempt({ ...order, method: { id } }, engine) instanceof Error,
    )
    expect(refused.length).toBeLessThanOrEqual(3)
  })
})

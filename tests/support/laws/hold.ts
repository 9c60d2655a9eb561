import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DraftOrder, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { anyOrder, correctedOrder, namedOrders } from './orders'
import { drafted } from './redraft'
import type { DraftLaw, OrderLaw, Violation } from './violation'

/** How many random orders a law is tried on, for each garment. */
export const runs = Number(process.env.LAWS_RUNS ?? 200)

/** A share of the runs, for laws that draft each order many times. */
export const fewer = (by: number): number => Math.max(5, Math.round(runs / by))

function breaches(law: DraftLaw, order: DraftOrder): readonly Violation[] {
  const draft = drafted(order, engine)
  return draft ? law(draft, order, engine) : []
}

const each = (only?: readonly string[]): [string, GarmentDefinition][] =>
  engine.garments
    .filter(({ id }) => only?.includes(id) ?? true)
    .map((garment): [string, GarmentDefinition] => [garment.id, garment])

/** Where a law is stated: all garments and all kinds of orders unless it says which. */
interface Scope {
  readonly garments?: readonly string[]
  /** Whether random styles and corrections are tried beside the bodies with names. */
  readonly random?: boolean
  /** What is changed in every order: another drafting method. */
  readonly change?: (order: DraftOrder) => DraftOrder
  /** Only a share of the random runs. */
  readonly by?: number
}

/**
 * States that a law holds for every garment: for the published sizes, the bodies of the sanity figures and the extreme
 * ones, for random bodies and styles, and for corrected drafts.
 */
export function holdsForDrafts(
  law: DraftLaw,
  { garments, random = true, change = (order) => order, by = 1 }: Scope = {},
): void {
  describe.each(each(garments))('%s', (_, garment) => {
    it('published sizes and bodies at the edges, by rule and on a tape', () => {
      const found = namedOrders(garment).flatMap(({ name, order }) =>
        breaches(law, change(order)).map((one) => ({ body: name, ...one })),
      )
      expect(found).toEqual([])
    })

    if (!random) return

    it('random bodies and styles, the corners of the ranges among them', () => {
      fc.assert(
        fc.property(anyOrder(garment), (order) => {
          expect(breaches(law, change(order))).toEqual([])
        }),
        { numRuns: fewer(by), endOnFailure: true },
      )
    })

    it('corrected drafts', () => {
      fc.assert(
        fc.property(correctedOrder(garment), (order) => {
          expect(breaches(law, change(order))).toEqual([])
        }),
        { numRuns: fewer(4 * by), endOnFailure: true },
      )
    })
  })
}

/** States that a law holds for every garment, where the law drafts each order again and again. */
export function holdsForOrders(
  law: OrderLaw,
  {
    by,
    garments,
    orders = anyOrder,
  }: Pick<Scope, 'garments'> & {
    by: number
    orders?: (garment: GarmentDefinition) => fc.Arbitrary<DraftOrder>
  },
): void {
  it.each(each(garments))('%s', (_, garment) => {
    fc.assert(
      fc.property(orders(garment), (order) => {
        expect(law(order, engine)).toEqual([])
      }),
      { numRuns: fewer(by), endOnFailure: true },
    )
  })
}

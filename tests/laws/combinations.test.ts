import { describe, expect, it } from 'vitest'
import { choicesOf, combinations, ruledOut } from '@/drafting/combinations'
import type { DesignChoice, DesignValue, GarmentDefinition } from '@/drafting/contract'
import * as engine from '@/drafting/index'
import { sanityBodies } from '../support/bodies'
import { attempt } from '../support/laws/redraft'

type Design = Readonly<Record<string, DesignChoice>>

const each = engine.garments.map((garment): [string, GarmentDefinition] => [garment.id, garment])

/** All that a value can be chosen to be; a number of things is a choice too. */
function waysOf(value: DesignValue): readonly DesignChoice[] {
  if (value.kind !== 'count') return choicesOf(value)
  const { min = 0, max = 0 } = value
  return Array.from({ length: max - min + 1 }, (_, index) => min + index)
}

/** The design with everything chosen that its choices hang on. */
function withGround(garment: GarmentDefinition, design: Design): Design {
  const all: Record<string, DesignChoice> = { ...design }
  for (let missing = true; missing;) {
    missing = false
    for (const id of Object.keys(all)) {
      const { when } = garment.design.find((value) => value.id === id) ?? {}
      if (!when || all[when.id] !== undefined) continue
      all[when.id] = when.is[0] as DesignChoice
      missing = true
    }
  }
  return all
}

/** Every choice with every other, once each. */
function pairs(garment: GarmentDefinition): readonly Design[] {
  const values = garment.design.filter((value) => waysOf(value).length > 0)
  const found = new Map<string, Design>()
  values.forEach((one, index) => {
    for (const other of values.slice(index + 1)) {
      for (const a of waysOf(one)) {
        for (const b of waysOf(other)) {
          const design = withGround(garment, { [one.id]: a, [other.id]: b })
          found.set(JSON.stringify(Object.entries(design).sort()), design)
        }
      }
    }
  })
  return [...found.values()]
}

/** Why a combination is not offered; undefined when it is. */
function whyNot(garment: GarmentDefinition, design: Design): string | undefined {
  const chosen = (id: string): DesignChoice | undefined =>
    design[id] ?? garment.design.find((value) => value.id === id)?.default
  return Object.entries(design)
    .map(([id, choice]) => ruledOut(garment.id, id, choice, chosen))
    .find((why) => why !== undefined)
}

/** Whether what its values hang on is chosen: a value that hangs on another choice is not part of the combination. */
function hangsTogether(garment: GarmentDefinition, design: Design): boolean {
  return Object.keys(design).every((id) => {
    const { when } = garment.design.find((value) => value.id === id) ?? {}
    return !when || when.is.includes(design[when.id] as DesignChoice)
  })
}

describe('combinations of choices', () => {
  it.each(each)('%s: every one that is offered can be drafted', (_, garment) => {
    const offered = pairs(garment).filter(
      (design) => hangsTogether(garment, design) && whyNot(garment, design) === undefined,
    )
    const refused = offered.flatMap((design) => {
      const order = { garment: garment.id, measurements: sanityBodies.one, design, explain: false }
      const result = attempt(order, engine)
      return result instanceof Error ? [{ design, why: result.message }] : []
    })
    expect(refused).toEqual([])
  })

  it('are offered but for one in twenty at most', () => {
    const all = engine.garments.flatMap((garment) =>
      pairs(garment)
        .filter((design) => hangsTogether(garment, design))
        .map((design) => whyNot(garment, design)),
    )
    expect(all.filter((why) => why === undefined).length / all.length).toBeGreaterThanOrEqual(0.95)
  })

  it('that are not offered are refused at the value to change, with the reason of the table', () => {
    for (const { garments, when, not, why } of combinations) {
      for (const id of garments) {
        const garment = engine.garments.find((one) => one.id === id)
        expect(garment, id).toBeDefined()
        for (const choice of not.is) {
          const design = {
            ...Object.fromEntries(Object.entries(when).map(([name, is]) => [name, is[0] as DesignChoice])),
            [not.id]: choice,
          }
          const result = attempt({ garment: id, measurements: sanityBodies.one, design }, engine)
          if (!(result instanceof engine.DraftingError)) throw new Error(`${id} was drafted: ${why}`)
          expect(result.problems.map(({ field }) => field)).toEqual([not.id])
          expect(result.problems[0]?.message).toContain(why)
        }
      }
    }
  })

  it('that only a default would make give way to what was chosen', () => {
    const order = {
      garment: 'gathered-skirt',
      measurements: sanityBodies.one,
      design: { opening: 'side zip' },
    }
    const draft = engine.draftGarment(order)
    expect(draft.pieces.some(({ id }) => id === 'pocket-bag')).toBe(false)
    const garment = engine.garments.find(({ id }) => id === 'gathered-skirt') as GarmentDefinition
    const pockets = garment.design.find(({ id }) => id === 'pockets') as DesignValue
    const chosen = (id: string): DesignChoice | undefined =>
      id === 'opening' ? 'side zip' : garment.design.find((value) => value.id === id)?.default
    expect(engine.isOffered(pockets, chosen, garment)).toBe(false)
    expect(
      engine.isOffered(pockets, (id) => (id === 'opening' ? 'centre-back zip' : chosen(id)), garment),
    ).toBe(true)
  })

  it('a value is offered only where what it hangs on is', () => {
    const garment = engine.garments.find(({ id }) => id === 'straight-skirt') as GarmentDefinition
    const height = garment.design.find(({ id }) => id === 'ventHeight') as DesignValue
    const chosen = (opening: string) => (id: string) =>
      id === 'opening' ? opening : garment.design.find((value) => value.id === id)?.default
    expect(engine.isOffered(height, chosen('centre-back zip'), garment)).toBe(true)
    expect(engine.isOffered(height, chosen('side zip'), garment)).toBe(false)
  })
})

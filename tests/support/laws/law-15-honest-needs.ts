import type { Draft, DraftOrder, GarmentDefinition, MeasurementDefinition } from '@/drafting/contract'
import { garmentOf } from './formulas'
import { attempt, drafted, withMeasurement } from './redraft'
import { Findings, type Engine, type Violation } from './violation'

type MeasuringEngine = Engine & { readonly measurements: readonly MeasurementDefinition[] }

/** What is not declared changes nothing; what is needed is asked for; what was used is what is declared. */
export function honestNeeds(order: DraftOrder, engine: MeasuringEngine): readonly Violation[] {
  const found = new Findings(15)
  const garment = garmentOf(order, engine.garments)
  const declared = declaredBy(garment)
  const before = drafted(order, engine)
  if (!before) return found.all
  for (const { id, min, max } of engine.measurements) {
    if (declared.includes(id)) continue
    for (const mm of [min, (min + max) / 2, max]) {
      const after = drafted(withMeasurement(order, id, mm), engine)
      if (JSON.stringify(after) !== JSON.stringify(before)) {
        found.add(id, 'is not declared and changes the draft')
      }
    }
  }
  for (const id of garment.needs) {
    const { [id]: _left, ...rest } = order.measurements
    const result = attempt({ ...order, measurements: rest }, engine)
    const asked =
      result instanceof Error &&
      result.problems.some((one) => one.field === id && one.code === 'missing-measurement')
    if (!asked) found.add(id, 'is needed and not asked for when it is missing')
  }
  for (const id of garment.needs) {
    if (before.used[id] === undefined) found.add(id, 'is needed and not among what was used')
  }
  for (const id of Object.keys(before.used)) {
    if (!declared.includes(id)) found.add(id, 'was used and is not declared')
  }
  return found.all
}

function declaredBy(garment: GarmentDefinition): readonly string[] {
  return [...garment.needs, ...garment.estimates]
}

/**
 * Declared measurements that change no draft at all, neither on a full card nor on one that holds only what is needed.
 * What counts is what was drawn and checked, not the list of what the card said.
 */
export function idleNeeds(
  garment: GarmentDefinition,
  orders: readonly DraftOrder[],
  engine: Engine,
): string[] {
  return declaredBy(garment).filter((id) => !orders.some((order) => counts(id, order, garment, engine)))
}

function counts(id: string, order: DraftOrder, garment: GarmentDefinition, engine: Engine): boolean {
  const mm = order.measurements[id]
  if (mm === undefined) return false
  const needed = Object.fromEntries(
    Object.entries(order.measurements).filter(([name]) => garment.needs.includes(name)),
  )
  return [order.measurements, needed].some((card) => {
    const one = drafted({ ...order, measurements: { ...card, [id]: mm } }, engine)
    const other = drafted({ ...order, measurements: { ...card, [id]: mm + 6 } }, engine)
    return one && other && drawn(one) !== drawn(other)
  })
}

function drawn(draft: Draft): string {
  return JSON.stringify([draft.pieces, draft.fits, draft.seams, draft.notions])
}

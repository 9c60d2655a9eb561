import type { Draft, DraftOrder, GarmentDefinition, Handle, Point } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import { withValue } from '@/components/studio/field-ref'
import { currentValue, kindOf, nudgeOf } from '@/components/studio/values'
import type { Unit } from '@/components/studio/state'
import { askedBy, markAt, type Asked } from './drag-point'

export interface DragSetting {
  readonly draftGarment: (order: DraftOrder) => Draft
  readonly garment: GarmentDefinition
  readonly unit: Unit
  /** Land on the tape's own divisions (⅛ in, 1 mm). */
  readonly onTape: boolean
}

/** Where a drag has come to: the values to keep and the draft they make. */
export interface DragStep {
  readonly asked: readonly Asked[]
  readonly order: DraftOrder
  readonly draft: Draft
}

/** Nearer than this, mm, a point counts as arrived. */
const arrived = 0.02
const rounds = 4

/**
 * Moves a point towards where it is wanted. A point's rates hold near the draft they were found in, so the draft is solved again from where each
 * round ended. On the tape one round mostly does: it ends when another would land on the same division.
 * @param order where the drag stands now
 * @param at the point's place in that draft
 * @param target where it is wanted, mm in its piece's frame
 * @returns undefined when the point is already there or cannot go that way
 */
export function solveDrag(
  setting: DragSetting,
  order: DraftOrder,
  handle: Handle,
  at: Point,
  target: Point,
): DragStep | undefined {
  let step: DragStep | undefined
  let place = at
  for (let round = 0; round < rounds; round += 1) {
    const from = step?.order ?? order
    const free = askedBy(handle, { x: target.x - place.x, y: target.y - place.y }, from, setting.garment)
    const asked = setting.onTape ? free.map((one) => onTape(one, setting)) : free
    if (asked.every(({ ref, value }) => currentValue(setting.garment, from, ref) === value)) break
    const next = asked.reduce((sum, { ref, value }) => withValue(sum, ref, value), from)
    const draft = tryOrder(setting, next)
    const moved = draft && markAt(draft, handle.piece, handle.mark)
    if (!draft || !moved) break
    if (step && distance(moved, target) >= distance(place, target)) break
    step = { asked, order: next, draft }
    if (distance(moved, place) < arrived) break
    place = moved
  }
  return step
}

const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y)

function onTape(asked: Asked, { garment, unit }: DragSetting): Asked {
  if (asked.stopped) return asked
  const fine = nudgeOf(kindOf(garment, asked.ref), unit, false)
  return { ...asked, value: Math.round(asked.value / fine) * fine }
}

function tryOrder({ draftGarment, unit }: DragSetting, order: DraftOrder): Draft | undefined {
  try {
    return draftGarment({ ...order, unit, explain: false })
  } catch (error) {
    if (error instanceof DraftingError) return undefined
    throw error
  }
}

import type { Draft, DraftOrder, GarmentDefinition, Handle, Point } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import { withValue } from '@/components/studio/field-ref'
import { kindOf, nudgeOf } from '@/components/studio/values'
import type { Unit } from '@/components/studio/state'
import { askedBy, markAt, type Asked } from './drag-point'

export interface DragSetting {
  readonly draftGarment: (order: DraftOrder) => Draft
  readonly garment: GarmentDefinition
  readonly unit: Unit
  /** Land on the tape's own divisions (⅛ in, 1 mm). */
  readonly onTape: boolean
}

/** Nearer than this, mm, a point counts as arrived. */
const arrived = 0.02
const rounds = 4

/**
 * The values that bring a dragged point nearest to where it is wanted. A point's rates hold near the draft they were found in, so the draft is
 * solved again from where each round ended.
 * @param order where the drag stands now
 * @param at the point's place in that draft
 * @param target where it is wanted, mm in its piece's frame
 * @returns the values to draft with; empty when the point cannot go that way
 */
export function solveDrag(
  setting: DragSetting,
  order: DraftOrder,
  handle: Handle,
  at: Point,
  target: Point,
): readonly Asked[] {
  let now = order
  let place = at
  let asked: readonly Asked[] = []
  for (let round = 0; round < rounds; round += 1) {
    const next = askedBy(handle, { x: target.x - place.x, y: target.y - place.y }, now, setting.garment)
    const drafted = tryOrder(setting, withAsked(now, next))
    if (!drafted) break
    asked = next
    now = withAsked(now, next)
    const moved = markAt(drafted, handle.piece, handle.mark)
    if (!moved || Math.hypot(moved.x - place.x, moved.y - place.y) < arrived) break
    place = moved
  }
  return setting.onTape ? asked.map((one) => onTape(one, setting)) : asked
}

function onTape(asked: Asked, { garment, unit }: DragSetting): Asked {
  if (asked.stopped) return asked
  const fine = nudgeOf(kindOf(garment, asked.ref), unit, false)
  return { ...asked, value: Math.round(asked.value / fine) * fine }
}

function withAsked(order: DraftOrder, asked: readonly Asked[]): DraftOrder {
  return asked.reduce((sum, { ref, value }) => withValue(sum, ref, value), order)
}

function tryOrder({ draftGarment }: DragSetting, order: DraftOrder): Draft | undefined {
  try {
    return draftGarment({ ...order, explain: false })
  } catch (error) {
    if (error instanceof DraftingError) return undefined
    throw error
  }
}

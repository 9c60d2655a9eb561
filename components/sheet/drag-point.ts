import type { DraftOrder, Draft, GarmentDefinition, Handle, Point } from '@/drafting/contract'
import type { FieldRef } from '@/components/studio/field-ref'
import { currentValue } from '@/components/studio/values'

/** A value that a dragged point asks for. */
export interface Asked {
  readonly ref: FieldRef
  readonly value: number
  /** The end of the range that stopped it. */
  readonly stopped?: { readonly at: number; readonly end: 'least' | 'most' }
}

/**
 * What the values of a point must become for it to move by (dx, dy), mm in its piece's frame, by the point's own rates. Two moves are solved
 * together; where they lie along each other, or there is one, the nearest place on it is taken. Values stop at the ends of their ranges.
 */
export function askedBy(
  handle: Handle,
  by: Point,
  order: DraftOrder,
  garment: GarmentDefinition,
): readonly Asked[] {
  return distances(handle, by).map((distance, index) => {
    const move = handle.moves[index] as Handle['moves'][number]
    const ref: FieldRef = `design.${move.value}`
    const now = currentValue(garment, order, ref)
    const wanted = (typeof now === 'number' ? now : 0) + distance * move.perMm
    const range = garment.design.find((value) => value.id === move.value)
    if (range?.min !== undefined && wanted < range.min)
      return { ref, value: range.min, stopped: { at: range.min, end: 'least' } }
    if (range?.max !== undefined && wanted > range.max)
      return { ref, value: range.max, stopped: { at: range.max, end: 'most' } }
    return { ref, value: wanted }
  })
}

/** How far along each move, mm, brings the point nearest to where it is wanted. */
function distances(handle: Handle, by: Point): readonly number[] {
  const [first, second] = handle.moves
  if (!first) return []
  const along = (direction: Point) => by.x * direction.x + by.y * direction.y
  if (!second) return [along(first.along)]
  const cross = first.along.x * second.along.y - first.along.y * second.along.x
  if (Math.abs(cross) < 0.05) return [along(first.along)]
  return [
    (by.x * second.along.y - by.y * second.along.x) / cross,
    (first.along.x * by.y - first.along.y * by.x) / cross,
  ]
}

/** Where a mark lies in a draft, in its piece's frame. */
export function markAt(draft: Draft, piece: string, mark: string): Point | undefined {
  return draft.pieces.find((other) => other.id === piece)?.marks.find((other) => other.id === mark)?.at
}

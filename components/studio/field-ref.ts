import type { DraftOrder } from '@/drafting/contract'

/** One thing of an order that can be typed: a measurement, a style choice or a rule's formula. */
export type FieldRef = `measurements.${string}` | `design.${string}` | `rules.${string}`

export type FieldValue = number | string | boolean

type FieldKind = 'measurements' | 'design' | 'rules'

/** 'design.neckWidth' → { kind: 'design', id: 'neckWidth' }. */
export function partsOf(ref: FieldRef): { kind: FieldKind; id: string } {
  const dot = ref.indexOf('.')
  return { kind: ref.slice(0, dot) as FieldKind, id: ref.slice(dot + 1) }
}

/** What an order says of a field; undefined when the garment's own default stands. */
export function valueOf(order: DraftOrder, ref: FieldRef): FieldValue | undefined {
  const { kind, id } = partsOf(ref)
  return order[kind]?.[id]
}

/** The order with one field changed, or without it (undefined: the garment's own default again). */
export function withValue(order: DraftOrder, ref: FieldRef, value: FieldValue | undefined): DraftOrder {
  const { kind, id } = partsOf(ref)
  const rest = Object.fromEntries(Object.entries(order[kind] ?? {}).filter(([key]) => key !== id))
  return { ...order, [kind]: value === undefined ? rest : { ...rest, [id]: value } }
}

/** Whether a problem is about this field: the engine names fields by their id, with or without their kind. */
export function isAbout(field: string, ref: FieldRef): boolean {
  return field === ref || field === partsOf(ref).id
}

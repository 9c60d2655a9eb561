import * as z from 'zod'
import { idShape, lines, requiredLine } from './ids'
import { lengthShape, unitShape } from './length'

/** A measurement of the engine's, or one of the workroom's own, whose words are joined by underscores. */
const measurementId = z.string().regex(/^[a-zA-Z][a-zA-Z0-9_]{0,39}$/, 'This measurement is not known.')

/** A measure card as it is written. Without a client it holds the member's own measurements. */
export const cardShape = z.strictObject({
  id: idShape,
  clientId: idShape.nullable(),
  name: requiredLine(120, 'a name for the card'),
  takenOn: z.iso.date('Write the date as year-month-day, such as 2026-03-14.'),
  unit: unitShape,
  note: lines(5000),
  values: z
    .record(measurementId, lengthShape)
    .refine((values) => Object.keys(values).length <= 100, 'At most 100 measurements on a card.'),
})
export type CardInput = z.input<typeof cardShape>

/** A card stays with its client: the rest may change. */
export const cardChangeShape = cardShape.omit({ clientId: true })
export type CardChange = z.input<typeof cardChangeShape>

import * as z from 'zod'
import { idShape } from './ids'

/** drawing: pieces and checks; lesson: also the steps and their sums, which show the body's measurements. */
export const shareScopes = ['drawing', 'lesson'] as const
export type ShareScope = (typeof shareScopes)[number]

export const shareShape = z.strictObject({
  draftId: idShape,
  id: idShape,
  scope: z.enum(shareScopes, 'A link shows the drawing, or the lesson with its sums.'),
  expiresOn: z.iso.date('Write the date as year-month-day, such as 2026-03-14.'),
})
export type ShareInput = z.input<typeof shareShape>

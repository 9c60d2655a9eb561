import * as z from 'zod'
import { idShape, pageShape, requiredLine, searchShape } from './ids'
import { orderShape, typedShape } from './order'

/** work: for a client or for stock; teaching: shown to the workroom's tutors and students; practice: a student's own. */
export const draftPurposes = ['work', 'teaching', 'practice'] as const
export type DraftPurpose = (typeof draftPurposes)[number]

export const draftNameShape = requiredLine(120, 'a name for the draft')

export const draftShape = z.strictObject({
  id: idShape,
  revisionId: idShape,
  name: draftNameShape,
  purpose: z.enum(draftPurposes).optional(),
  clientId: idShape.nullish(),
  cardId: idShape.nullish(),
  order: orderShape,
  typed: typedShape.default({}),
})
export type DraftInput = z.input<typeof draftShape>

export const draftListShape = z.strictObject({
  clientId: idShape.optional(),
  search: searchShape,
  archived: z.boolean().default(false),
  page: pageShape,
})
export type DraftListInput = z.input<typeof draftListShape>

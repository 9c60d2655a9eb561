import * as z from 'zod'
import { idShape, requiredLine } from './ids'
import { orderShape, typedShape } from './order'

/** auto: saved while working, thinned later; named: saved by hand and kept for ever. */
export const revisionKinds = ['auto', 'named'] as const
export type RevisionKind = (typeof revisionKinds)[number]

export const revisionShape = z
  .strictObject({
    draftId: idShape,
    id: idShape,
    basedOn: idShape,
    order: orderShape,
    typed: typedShape,
    kind: z.enum(revisionKinds),
    name: requiredLine(120, 'a name for the version').optional(),
  })
  .refine((revision) => revision.kind === 'auto' || revision.name !== undefined, {
    path: ['name'],
    message: 'Give the version a name, such as First fitting.',
  })
export type RevisionInput = z.input<typeof revisionShape>

import * as z from 'zod'
import { workroomRoute } from '@/app/_server/session'
import { listRevisions, saveRevision } from '@/db/access/revisions'
import { idShape } from '@/db/shapes/ids'
import { orderShape, typedShape } from '@/db/shapes/order'
import { revisionKinds } from '@/db/shapes/revision'

/** The versions of a draft, newest first. */
export const GET = workroomRoute(z.strictObject({ id: idShape }), (actor, { id }) => listRevisions(actor, id))

const sent = z.strictObject({
  id: idShape,
  revisionId: idShape,
  basedOn: idShape,
  order: orderShape,
  typed: typedShape,
  kind: z.enum(revisionKinds),
  name: z.string().max(120).optional(),
})

/** Saves a version. The same id with the same body is answered again; on a conflict both are kept and the newer head is sent back. */
export const POST = workroomRoute(sent, async (actor, { id, revisionId, ...revision }) => {
  return saveRevision(actor, { ...revision, draftId: id, id: revisionId })
})

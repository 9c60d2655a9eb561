import * as z from 'zod'
import { drawnOtherwise } from '@/app/_server/print/kept-or-drawn'
import { workroomRoute } from '@/app/_server/session'
import { keptDraft } from '@/db/access/kept-drafts'
import { getRevision } from '@/db/access/revisions'
import { idShape } from '@/db/shapes/ids'

/** The drawing of a version as it was printed or shared, when it would be drawn otherwise today; null when it would not. */
export const GET = workroomRoute(z.strictObject({ id: idShape }), async (actor, { id }) => {
  const [revision, kept] = await Promise.all([getRevision(actor, id), keptDraft(actor, id)])
  return drawnOtherwise(revision.order, kept)
})

import * as z from 'zod'
import { workroomRoute } from '@/app/_server/session'
import { notFound } from '@/db/access-error'
import { getRevision } from '@/db/access/revisions'
import { idShape } from '@/db/shapes/ids'

/** One version with its order, to be opened again. */
export const GET = workroomRoute(
  z.strictObject({ id: idShape, revisionId: idShape }),
  async (actor, { id, revisionId }) => {
    const revision = await getRevision(actor, revisionId)
    if (revision.draftId !== id) throw notFound('version')
    return revision
  },
)

import * as z from 'zod'
import { appOrigin } from '@/app/_server/config'
import { workroomRoute } from '@/app/_server/session'
import { createShare, listShares } from '@/db/access/shares'
import { idShape } from '@/db/shapes/ids'
import { shareShape } from '@/db/shapes/share'

/** The links to a draft, newest first. */
export const GET = workroomRoute(z.strictObject({ id: idShape }), (actor, { id }) => listShares(actor, id))

const sent = z.strictObject({
  id: idShape,
  shareId: idShape,
  scope: shareShape.shape.scope,
  expiresOn: shareShape.shape.expiresOn,
})

/** Makes a link. The same id again gives the same link. */
export const POST = workroomRoute(sent, async (actor, { id, shareId, scope, expiresOn }) => {
  const { share, token } = await createShare(actor, { id: shareId, draftId: id, scope, expiresOn })
  return { share, url: `${appOrigin()}/s/${token}` }
})

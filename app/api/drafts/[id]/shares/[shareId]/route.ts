import * as z from 'zod'
import { workroomRoute } from '@/app/_server/session'
import { revokeShare } from '@/db/access/shares'
import { idShape } from '@/db/shapes/ids'

/** Takes a link back: the next request through it finds nothing. */
export const DELETE = workroomRoute(z.strictObject({ id: idShape, shareId: idShape }), (actor, { shareId }) =>
  revokeShare(actor, shareId),
)

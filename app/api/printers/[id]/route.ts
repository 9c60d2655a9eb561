import * as z from 'zod'
import { workroomRoute } from '@/app/_server/session'
import { forgetPrinter } from '@/db/access/printers'
import { idShape } from '@/db/shapes/ids'

/** Forgets a printer. */
export const DELETE = workroomRoute(z.strictObject({ id: idShape }), (actor, { id }) =>
  forgetPrinter(actor, id),
)

import * as z from 'zod'
import { chalkAnswer } from '@/app/_server/print/chalk-answer'
import { workroomRoute } from '@/app/_server/session'
import { idShape } from '@/db/shapes/ids'
import { printed } from '../_printed'

const shape = z.strictObject({
  id: idShape,
  paper: z.enum(['a4', 'letter'], 'The chalk guide is printed on a4 or letter.').default('a4'),
})

/** The chalk guide of a version: how it is cut without paper. */
export const GET = workroomRoute(shape, async (actor, { id, paper }) => {
  const { printable } = await printed(actor, id)
  return chalkAnswer(printable, paper)
})

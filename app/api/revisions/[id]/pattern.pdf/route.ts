import * as z from 'zod'
import { pdfAnswer } from '@/app/_server/print/answers'
import { printChoices, whichDrawing } from '@/app/_server/print/choices'
import { workroomRoute } from '@/app/_server/session'
import { idShape } from '@/db/shapes/ids'
import { printed } from '../_printed'

/** The paper pattern of a version, in pages. */
export const GET = workroomRoute(
  z.strictObject({ id: idShape, drawing: whichDrawing, ...printChoices }),
  async (actor, { id, drawing, ...choices }, request) => {
    const { printable, draft } = await printed(actor, id, drawing)
    return pdfAnswer(printable, draft, choices, request.signal)
  },
)

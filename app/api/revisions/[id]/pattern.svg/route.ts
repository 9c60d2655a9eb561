import * as z from 'zod'
import { svgAnswer } from '@/app/_server/print/answers'
import { drawingChoices, whichDrawing } from '@/app/_server/print/choices'
import { workroomRoute } from '@/app/_server/session'
import { idShape } from '@/db/shapes/ids'
import { printed } from '../_printed'

/** The pattern of a version on one sheet at true scale. */
export const GET = workroomRoute(
  z.strictObject({ id: idShape, drawing: whichDrawing, ...drawingChoices }),
  async (actor, { id, drawing, ...choices }) => {
    const { printable, draft } = await printed(actor, id, drawing)
    return svgAnswer(printable, draft, choices)
  },
)

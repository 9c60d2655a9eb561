import { svgAnswer } from '@/app/_server/print/answers'
import { drawingChoices } from '@/app/_server/print/choices'
import { printableOf } from '@/app/_server/share/printable-of'
import { sharedDrawing } from '@/app/_server/share/shared-drawing'
import { sharedRoute } from '@/app/_server/share/shared-route'

/** A shared pattern on one sheet at true scale. */
export const GET = sharedRoute(drawingChoices, async (share, choices) => {
  const { draft } = await sharedDrawing(share)
  return svgAnswer(printableOf(share), draft, choices)
})

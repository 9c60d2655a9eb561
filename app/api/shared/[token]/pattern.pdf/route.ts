import { pdfAnswer } from '@/app/_server/print/answers'
import { printChoices } from '@/app/_server/print/choices'
import { printableOf } from '@/app/_server/share/printable-of'
import { sharedDrawing } from '@/app/_server/share/shared-drawing'
import { sharedRoute } from '@/app/_server/share/shared-route'

/** The paper pattern of a shared draft, in pages. */
export const GET = sharedRoute(printChoices, async (share, choices) => {
  const { draft } = await sharedDrawing(share)
  return pdfAnswer(printableOf(share), draft, choices)
})

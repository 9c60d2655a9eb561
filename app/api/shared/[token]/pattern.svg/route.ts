import { svgAnswer } from '@/app/_server/print/answers'
import { drawingChoices } from '@/app/_server/print/choices'
import { draftOf } from '@/app/_server/print/pattern-of'
import { printableOf } from '@/app/_server/share/printable-of'
import { sharedRoute } from '@/app/_server/share/shared-route'

/** A shared pattern on one sheet at true scale. */
export const GET = sharedRoute(drawingChoices, (share, choices) =>
  svgAnswer(printableOf(share), draftOf(share.order, null), choices),
)

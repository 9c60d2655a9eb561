import { pdfAnswer } from '@/app/_server/print/answers'
import { printChoices } from '@/app/_server/print/choices'
import { draftOf } from '@/app/_server/print/pattern-of'
import { printableOf } from '@/app/_server/share/printable-of'
import { sharedRoute } from '@/app/_server/share/shared-route'

/** The paper pattern of a shared draft, in pages. */
export const GET = sharedRoute(printChoices, (share, choices) =>
  pdfAnswer(printableOf(share), draftOf(share.order, null), choices),
)

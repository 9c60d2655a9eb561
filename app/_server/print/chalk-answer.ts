import 'server-only'
import { draftGarment } from '@/drafting'
import type { Draft, DraftOrder } from '@/drafting/contract'
import { tapes } from '@/drafting/chalk/tapes'
import { paperOf } from '@/drafting/drawing'
import { chalkPdf } from './chalk-pdf'
import { download } from './download'
import { titleOf } from './pattern-of'
import type { Printable } from './pattern-of'

/** A version drafted on the tape of its unit, with the steps that the chalk guide is told from. @throws DraftingError */
export function onTape(order: DraftOrder): Draft {
  return draftGarment({ ...order, tape: tapes[order.unit ?? 'cm'], explain: true })
}

/** The chalk guide of a version as a file to save. @throws DraftingError */
export async function chalkAnswer(printable: Printable, paper: 'a4' | 'letter'): Promise<Response> {
  const unit = printable.order.unit ?? 'cm'
  const bytes = await chalkPdf({
    draft: onTape(printable.order),
    title: titleOf(printable),
    paper: paperOf(paper),
    unit,
    tape: tapes[unit],
    savedAt: new Date(printable.savedAt),
  })
  return download(new Uint8Array(bytes), 'application/pdf', [printable.name, 'chalk guide'])
}

import 'server-only'
import type { KeptVersion } from '@/db/access/kept-drafts'
import { draftGarment } from '@/drafting'
import { type Difference, differences } from '@/drafting/compare/differences'
import type { Draft, DraftOrder } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'

/** A kept drawing that the engine would draw otherwise today. */
export interface DrawnOtherwise {
  /** As it was printed or shared. */
  readonly kept: Draft
  readonly keptAt: string
  /** Where the two are apart; empty when today's engine refuses the order altogether. */
  readonly differences: readonly Difference[]
  /** Whether it can be drawn today at all. */
  readonly drawable: boolean
}

/** The draft of a version as it is drawn today. @throws DraftingError */
export function drawnToday(order: DraftOrder): Draft {
  return draftGarment({ ...order, explain: true })
}

/** What was kept, otherwise drawn today: what was cut once is printed again as it was. @throws DraftingError */
export function keptOrDrawn(order: DraftOrder, kept: KeptVersion | null): Draft {
  return kept?.draft ?? drawnToday(order)
}

/** What was kept, when it is drawn otherwise today by more than a hundredth of a millimetre; null when nothing is to be said. */
export function drawnOtherwise(order: DraftOrder, kept: KeptVersion | null): DrawnOtherwise | null {
  if (!kept) return null
  const about = { kept: kept.draft, keptAt: kept.keptAt }
  try {
    const apart = differences(kept.draft, draftGarment({ ...order, explain: false }))
    return apart.length === 0 ? null : { ...about, differences: apart, drawable: true }
  } catch (error) {
    if (error instanceof DraftingError) return { ...about, differences: [], drawable: false }
    throw error
  }
}

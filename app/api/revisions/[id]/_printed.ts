import 'server-only'
import { getDraft } from '@/db/access/drafts'
import { keepPrinted, keptDraft } from '@/db/access/kept-drafts'
import { getRevision } from '@/db/access/revisions'
import { getWorkroom } from '@/db/access/workrooms'
import type { Actor } from '@/db/permissions'
import type { Draft } from '@/drafting/contract'
import { drawnToday, keptOrDrawn } from '@/app/_server/print/kept-or-drawn'
import type { Printable } from '@/app/_server/print/pattern-of'

/**
 * A version that the actor may read, ready for printing. It is marked as printed and its whole draft kept, so that what was cut
 * can always be printed again.
 * @param drawing `kept`: as it was first printed or shared; `today`: as the engine draws it now
 * @throws AccessError not-found, DraftingError
 */
export async function printed(
  actor: Actor,
  revisionId: string,
  drawing: 'kept' | 'today' = 'kept',
): Promise<{ printable: Printable; draft: Draft }> {
  const revision = await getRevision(actor, revisionId)
  const [details, kept, workroom] = await Promise.all([
    getDraft(actor, revision.draftId),
    keptDraft(actor, revisionId),
    getWorkroom(actor),
  ])
  const draft = drawing === 'kept' ? keptOrDrawn(revision.order, kept) : drawnToday(revision.order)
  await keepPrinted(actor, { revisionId, draft })
  const { savedAt, order } = revision
  const { name: maker, timeZone } = workroom
  return { printable: { name: details.name, version: revision.name, maker, timeZone, savedAt, order }, draft }
}

import 'server-only'
import { keepByLink, keptByLink } from '@/db/access/kept-drafts'
import type { OpenedShare } from '@/db/access/shares'
import type { Difference } from '@/drafting/compare/differences'
import type { Draft } from '@/drafting/contract'
import { drawnOtherwise, keptOrDrawn } from '../print/kept-or-drawn'

/**
 * The drawing that a link shows: as it was when somebody first saw or printed this version. It is kept with the first look, so
 * that visitors print what they saw.
 * @returns the drawing and, when today's engine would draw it otherwise, where
 * @throws DraftingError
 */
export async function sharedDrawing(
  share: OpenedShare,
): Promise<{ readonly draft: Draft; readonly otherwise: readonly Difference[] }> {
  const kept = await keptByLink(share)
  const draft = keptOrDrawn(share.order, kept)
  if (!kept) await keepByLink(share, draft)
  return { draft, otherwise: drawnOtherwise(share.order, kept)?.differences ?? [] }
}

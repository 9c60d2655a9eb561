'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { workroomAction } from '@/app/_server/session'
import { getCard } from '@/db/access/cards'
import { createDraft, renameDraft as rename } from '@/db/access/drafts'
import { getWorkroom } from '@/db/access/workrooms'
import { draftNameShape } from '@/db/shapes/draft'
import { idShape } from '@/db/shapes/ids'
import { invalid } from '@/db/access-error'
import { garments } from '@/drafting'
import { firstOrder } from './_parts/first-order'

const started = z.strictObject({
  id: idShape,
  revisionId: idShape,
  name: draftNameShape,
  garment: z.string().max(60),
  cardId: idShape,
})

/** Starts a draft: a garment on a measure card, with the workroom's usual allowances. */
export const startDraft = workroomAction(
  started,
  async (actor, { id, revisionId, name, garment, cardId }) => {
    const definition = garments.find((each) => each.id === garment)
    if (!definition) throw invalid('garment', 'Choose a garment from the list.')
    const [card, workroom] = await Promise.all([getCard(actor, cardId), getWorkroom(actor)])
    const { order, typed } = firstOrder(definition, card, workroom.allowances)
    await createDraft(actor, { id, revisionId, name, clientId: card.clientId, cardId, order, typed })
    revalidatePath('/drafts')
    return { id }
  },
)

/** Gives a draft another name. */
export const renameDraft = workroomAction(
  z.strictObject({ id: idShape, name: draftNameShape }),
  async (actor, { id, name }) => {
    await rename(actor, id, name)
    revalidatePath('/drafts')
  },
)

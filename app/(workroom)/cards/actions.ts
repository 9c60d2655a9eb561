'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { workroomAction } from '@/app/_server/session'
import { createCard, updateCard } from '@/db/access/cards'
import { cardShape } from '@/db/shapes/card'

const saved = z.strictObject({ ...cardShape.shape, isNew: z.boolean() })

/** Keeps a measure card as it stands. A new one is made first, so that a lost answer can simply be sent again. */
export const saveCard = workroomAction(saved, async (actor, { isNew, clientId, ...card }) => {
  if (isNew) await createCard(actor, { ...card, clientId })
  await updateCard(actor, card)
  revalidatePath(clientId ? `/clients/${clientId}` : '/cards')
  return { id: card.id }
})

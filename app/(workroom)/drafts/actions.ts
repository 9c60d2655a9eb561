'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { workroomAction } from '@/app/_server/session'
import { assignDraft } from '@/db/access/assigning'
import { listBlocks } from '@/db/access/blocks'
import { getCard } from '@/db/access/cards'
import { createDraft, renameDraft as rename } from '@/db/access/drafts'
import { getMethod } from '@/db/access/methods'
import { engineMeasurements } from '@/db/access/own-measurements'
import { getWorkroom } from '@/db/access/workrooms'
import type { Actor } from '@/db/permissions'
import { draftNameShape, draftPurposes } from '@/db/shapes/draft'
import { idShape } from '@/db/shapes/ids'
import { invalid } from '@/db/access-error'
import { garments, methods } from '@/drafting'
import { firstOrder } from './_parts/first-order'
import { fromBlocks } from './_parts/from-blocks'
import { publishedSize } from './_parts/published-sizes'

const started = z
  .strictObject({
    id: idShape,
    revisionId: idShape,
    name: draftNameShape,
    garment: z.string().max(60),
    cardId: idShape.optional(),
    sizeId: z.string().max(80).optional(),
    /** A built-in method's, or that of one of the workroom's own. */
    methodId: z.string().max(60).optional(),
    /** Whether it starts from the client's blocks. */
    fromBlock: z.boolean().default(false),
    purpose: z.enum(draftPurposes).optional(),
  })
  .refine(({ cardId, sizeId }) => (cardId === undefined) !== (sizeId === undefined), {
    path: ['cardId'],
    message: 'Choose a measure card or a published size.',
  })

/** The drafting method chosen. @throws AccessError not-found */
async function chosenMethod(actor: Actor, id: string | undefined) {
  if (id === undefined) return undefined
  return methods.find((method) => method.id === id) ?? getMethod(actor, id)
}

/** Starts a draft: a garment on a measure card or a published size, by a drafting method, with the workroom's usual allowances. */
export const startDraft = workroomAction(
  started,
  async (actor, { id, revisionId, name, garment, cardId, sizeId, methodId, fromBlock, purpose }) => {
    const definition = garments.find((each) => each.id === garment)
    if (!definition) throw invalid('garment', 'Choose a garment from the list.')
    const [card, workroom, method, own] = await Promise.all([
      cardId === undefined ? undefined : getCard(actor, cardId),
      getWorkroom(actor),
      chosenMethod(actor, methodId),
      engineMeasurements(actor),
    ])
    const body = card ?? { unit: workroom.unit, values: publishedSize(sizeId) }
    const plain = firstOrder(definition, body, {
      allowances: workroom.allowances,
      method,
      own,
    })
    const blocks = fromBlock && card?.clientId ? await listBlocks(actor, card.clientId) : []
    const { order, typed, left } = fromBlocks(plain, blocks, card)
    await createDraft(actor, {
      id,
      revisionId,
      name,
      purpose,
      clientId: card?.clientId,
      cardId,
      order,
      typed,
    })
    revalidatePath('/drafts')
    return { id, left }
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

/** Gives a draft to a maker, or takes it back. */
export const giveDraft = workroomAction(
  z.strictObject({ id: idShape, membershipId: idShape.nullable() }),
  async (actor, { id, membershipId }) => {
    const { assignedToName } = await assignDraft(actor, id, membershipId)
    revalidatePath('/drafts')
    return { assignedToName }
  },
)

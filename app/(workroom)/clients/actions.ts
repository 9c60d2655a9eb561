'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { workroomAction } from '@/app/_server/session'
import { removeBlock, setBlock } from '@/db/access/blocks'
import { archiveClient as archive, createClient, updateClient } from '@/db/access/clients'
import { clientShape } from '@/db/shapes/client'
import { idShape } from '@/db/shapes/ids'

const saved = z.strictObject({ ...clientShape.shape, isNew: z.boolean() })

/** Adds a client, or replaces what is known about one. */
export const saveClient = workroomAction(saved, async (actor, { isNew, ...client }) => {
  const { id } = await (isNew ? createClient(actor, client) : updateClient(actor, client))
  revalidatePath('/clients')
  return { id }
})

/** Takes a client out of the list, or back in. */
export const archiveClient = workroomAction(
  z.strictObject({ id: idShape, archived: z.boolean() }),
  async (actor, { id, archived }) => {
    await archive(actor, id, archived)
    revalidatePath('/clients')
  },
)

/** Makes a draft, as it stands now, the block from which later styles of its client start. */
export const makeBlock = workroomAction(z.strictObject({ draftId: idShape }), async (actor, { draftId }) => {
  await setBlock(actor, draftId)
  revalidatePath('/clients')
})

/** Later styles start from the rules again. */
export const dropBlock = workroomAction(
  z.strictObject({ clientId: idShape, garment: z.string().max(60) }),
  async (actor, { clientId, garment }) => {
    await removeBlock(actor, clientId, garment)
    revalidatePath('/clients')
  },
)

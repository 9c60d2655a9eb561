'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { workroomAction } from '@/app/_server/session'
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

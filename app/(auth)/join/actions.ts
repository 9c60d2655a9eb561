'use server'

import { publicAction } from '@/app/_server/session'
import { confirmJoin, requestJoin } from '@/db/access/joining'
import { confirmJoinShape, joinShape } from '@/db/shapes/account'

/** Asks to join: the answer says nothing about whether the address is known. */
export const join = publicAction(joinShape, async (input, address) => {
  await requestJoin(input, address)
  return { email: input.email }
})

/** Opens the workroom by the link of the mail. */
export const confirm = publicAction(confirmJoinShape, async (input) => confirmJoin(input))

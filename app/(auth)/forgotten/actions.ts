'use server'

import { publicAction } from '@/app/_server/session'
import { requestReset } from '@/db/access/new-passwords'
import { forgottenShape } from '@/db/shapes/account'

/** Asks for a mail to choose a new password by: the answer says nothing about whether the address is known. */
export const askForReset = publicAction(forgottenShape, async (input, address) => {
  await requestReset(input, address)
  return { email: input.email }
})

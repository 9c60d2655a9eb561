'use server'

import { log } from '@/app/_server/log'
import { signedInAction } from '@/app/_server/session'
import { changePassword } from '@/db/access/new-passwords'
import { changePasswordShape } from '@/db/shapes/account'

/** Sets a new password and signs every device out, this one included. */
export const setPassword = signedInAction(changePasswordShape, async (signedIn, input) => {
  const changed = await changePassword(signedIn, input)
  log.info({ userId: signedIn.userId }, 'password changed')
  return changed
})

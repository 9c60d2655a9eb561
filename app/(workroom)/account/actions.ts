'use server'

import { log } from '@/app/_server/log'
import { signedInAction } from '@/app/_server/session'
import { keepSession } from '@/app/_server/session/session-cookie'
import { changePassword } from '@/db/access/new-passwords'
import { changePasswordShape } from '@/db/shapes/account'

/** Sets a new password and signs every other device out; this one gets a new session with the answer. */
export const setPassword = signedInAction(changePasswordShape, async (signedIn, input) => {
  const { sessionId } = await changePassword(signedIn, input)
  await keepSession(sessionId)
  log.info({ userId: signedIn.userId, sessionId }, 'password changed')
})

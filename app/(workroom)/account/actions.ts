'use server'

import { revalidatePath } from 'next/cache'
import * as z from 'zod'
import { log } from '@/app/_server/log'
import { signedInAction } from '@/app/_server/session'
import { keepSession } from '@/app/_server/session/session-cookie'
import { changePassword } from '@/db/access/new-passwords'
import { endOwnSession } from '@/db/access/own-sessions'
import { changePasswordShape } from '@/db/shapes/account'
import { idShape } from '@/db/shapes/ids'

/** Sets a new password and signs every other device out; this one gets a new session with the answer. */
export const setPassword = signedInAction(changePasswordShape, async (signedIn, input) => {
  const { sessionId } = await changePassword(signedIn, input)
  await keepSession(sessionId)
  log.info({ userId: signedIn.userId, sessionId }, 'password changed')
})

/** Signs this person out on one of their devices. */
export const endSession = signedInAction(z.strictObject({ id: idShape }), async (signedIn, { id }) => {
  await endOwnSession(signedIn, id)
  log.info({ userId: signedIn.userId, sessionId: id }, 'session ended by its owner')
  revalidatePath('/account')
})

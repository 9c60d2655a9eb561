'use server'

import { cookies } from 'next/headers'
import * as z from 'zod'
import { currentSession, publicAction, signedInAction } from '@/app/_server/session'
import { sessionCookieName } from '@/app/_server/session/session-id'
import { log } from '@/app/_server/log'
import { endSession, switchWorkroom } from '@/db/access/sessions'
import { idShape } from '@/db/shapes/ids'

/** Ends the session here and in the database: a copy of the cookie is worth nothing from now on. */
export const signOut = publicAction(z.strictObject({}), async () => {
  const signedIn = await currentSession()
  if (signedIn) {
    await endSession(signedIn.sessionId)
    log.info({ userId: signedIn.userId, sessionId: signedIn.sessionId }, 'signed out')
  }
  const jar = await cookies()
  jar.delete(sessionCookieName())
})

/** Goes on in another workroom of the same person. */
export const changeWorkroom = signedInAction(
  z.strictObject({ workroomId: idShape }),
  async (signedIn, input) => switchWorkroom(signedIn, input.workroomId),
)

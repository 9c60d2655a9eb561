'use server'

import { publicAction, signedInAction } from '@/app/_server/session'
import { acceptAsSignedIn, acceptInvitation } from '@/db/access/invitations'
import { acceptKnownShape, acceptShape } from '@/db/shapes/account'

/** Accepts an invitation as somebody new. */
export const accept = publicAction(acceptShape, async (input) => acceptInvitation(input))

/** Accepts an invitation as the person who is signed in. */
export const acceptKnown = signedInAction(acceptKnownShape, async (signedIn, { token }) =>
  acceptAsSignedIn(signedIn, token),
)

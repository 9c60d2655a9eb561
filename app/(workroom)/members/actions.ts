'use server'

import * as z from 'zod'
import { log } from '@/app/_server/log'
import { workroomAction } from '@/app/_server/session'
import { inviteMember, withdrawInvitation } from '@/db/access/invitations'
import { changeRoles, setMemberDisabled } from '@/db/access/members'
import { changeRolesShape, disableMemberShape, inviteShape } from '@/db/shapes/account'
import { idShape } from '@/db/shapes/ids'

/** Sends an invitation by mail. */
export const invite = workroomAction(inviteShape, async (actor, input) => {
  const invitation = await inviteMember(actor, input)
  log.info({ by: actor.userId, invitation: invitation.id, roles: invitation.roles }, 'member invited')
  return invitation
})

/** Makes the link of an invitation worthless. */
export const withdraw = workroomAction(z.strictObject({ id: idShape }), async (actor, { id }) =>
  withdrawInvitation(actor, id),
)

/** Replaces what a member may do, from their next request on. */
export const setRoles = workroomAction(changeRolesShape, async (actor, input) => {
  await changeRoles(actor, input)
  log.info({ by: actor.userId, member: input.membershipId, roles: input.roles }, 'roles changed')
})

/** Shuts a member out, or lets them in again. */
export const setDisabled = workroomAction(disableMemberShape, async (actor, input) => {
  await setMemberDisabled(actor, input)
  log.info({ by: actor.userId, member: input.membershipId, disabled: input.disabled }, 'member disabled')
})

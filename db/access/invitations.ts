import 'server-only'
import { Op, type Transaction, UniqueConstraintError } from 'sequelize'
import type * as z from 'zod'
import { AccessError, invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Membership } from '../models/membership'
import { MembershipRole } from '../models/membership-role'
import { Token } from '../models/token'
import { User } from '../models/user'
import { Workroom } from '../models/workroom'
import { newId } from '../new-id'
import { hashPassword } from '../passwords'
import { type Actor, type Role, requireReach } from '../permissions'
import { secretToken } from '../secret-tokens'
import { acceptShape, inviteShape } from '../shapes/account'
import { inTransaction } from '../transactions'
import { knownId } from './known-id'
import { takeTry } from './limits'
import { enqueue } from './outbox'
import { type SignedIn, switchWorkroom } from './sessions'
import { issueToken, liveToken, spendToken } from './tokens'

export interface Invitation {
  readonly id: string
  readonly email: string
  readonly roles: readonly Role[]
  readonly expiresAt: string
}

export interface OpenedInvitation {
  readonly email: string
  readonly workroomName: string
  readonly invitedBy: string
  readonly roles: readonly Role[]
  /** The person has an account already and accepts by signing in. */
  readonly known: boolean
}

const plain = (token: Token): Invitation => ({
  id: token.id,
  email: token.email,
  roles: token.details.roles ?? [],
  expiresAt: token.expiresAt.toISOString(),
})

/** Invitations that were neither accepted nor withdrawn. */
export async function listInvitations(actor: Actor): Promise<Invitation[]> {
  requireReach(actor, 'members', 'read')
  const tokens = await Token.findAll({
    where: {
      kind: 'invitation',
      workroomId: actor.workroomId,
      usedAt: null,
      expiresAt: { [Op.gt]: new Date() },
    },
    order: [['createdAt', 'desc']],
  })
  return tokens.map(plain)
}

/**
 * Invites somebody by mail, with the roles they will have. The same id again sends nothing more.
 * @throws AccessError invalid (already a member), limited
 */
export async function inviteMember(actor: Actor, input: z.input<typeof inviteShape>): Promise<Invitation> {
  const { id, email, roles } = checkInput(inviteShape, input)
  requireReach(actor, 'members', 'write')
  await takeTry('invitations of workroom', actor.workroomId)
  const { workroomId } = actor
  const user = await User.findOne({ where: { email } })
  if (user && (await Membership.count({ where: { workroomId, userId: user.id, disabledAt: null } })) > 0)
    throw invalid('email', 'This person is a member already. Change their roles in the list.')
  const inviter = await User.findByPk(actor.userId, { rejectOnEmpty: true })
  return inTransaction(async (transaction) => {
    const earlier = await Token.findByPk(id, { transaction })
    if (earlier && earlier.workroomId !== workroomId)
      throw new AccessError('conflict', 'This id is taken. Reload the page and try again.')
    if (earlier) return plain(earlier)
    const details = { roles, invitedBy: inviter.name }
    const token = await issueToken('invitation', id, { email, workroomId, details }, transaction)
    await enqueue('mail-invitation', { tokenId: id }, { workroomId, transaction })
    return plain(token)
  })
}

/** Makes the link of an invitation worthless. @throws AccessError not-found */
export async function withdrawInvitation(actor: Actor, id: string): Promise<void> {
  requireReach(actor, 'members', 'write')
  const [ended] = await Token.update(
    { expiresAt: new Date() },
    {
      where: {
        id: knownId(id, 'invitation'),
        kind: 'invitation',
        workroomId: actor.workroomId,
        usedAt: null,
      },
    },
  )
  if (ended === 0) throw notFound('invitation')
}

/** For the mail: the invitation and its link, or null when it was withdrawn meanwhile. */
export async function invitationLink(
  tokenId: string,
): Promise<(OpenedInvitation & { readonly token: string }) | null> {
  const token = secretToken('invitation', tokenId)
  const opened = await openInvitation(token)
  return opened && { ...opened, token }
}

/** What the link of an invitation offers, or null when it was used, withdrawn or has expired. */
export async function openInvitation(token: string): Promise<OpenedInvitation | null> {
  const found = await liveToken('invitation', token)
  const workroom = found?.workroomId && (await Workroom.findByPk(found.workroomId))
  if (!found || !workroom) return null
  return {
    email: found.email,
    workroomName: workroom.name,
    invitedBy: found.details.invitedBy ?? '',
    roles: found.details.roles ?? [],
    known: (await User.count({ where: { email: found.email } })) > 0,
  }
}

async function enrol(userId: string, invitation: Token, transaction: Transaction): Promise<string> {
  const workroomId = invitation.workroomId ?? ''
  const [membership] = await Membership.findOrCreate({
    where: { workroomId, userId },
    defaults: { id: newId(), workroomId, userId, disabledAt: null },
    transaction,
  })
  await membership.update({ disabledAt: null }, { transaction })
  await MembershipRole.destroy({ where: { membershipId: membership.id }, transaction })
  await MembershipRole.bulkCreate(
    (invitation.details.roles ?? []).map((role) => ({ membershipId: membership.id, role, workroomId })),
    { transaction },
  )
  return workroomId
}

/** Accepts an invitation as somebody new. @throws AccessError invalid, conflict (has an account already) */
export async function acceptInvitation(input: z.input<typeof acceptShape>): Promise<{ email: string }> {
  const { token, name, password } = checkInput(acceptShape, input)
  const passwordHash = await hashPassword(password)
  try {
    return await inTransaction(async (transaction) => {
      const invitation = await spendToken('invitation', token, transaction)
      const { email } = invitation
      const user = await User.create(
        { id: newId(), email, name, passwordHash, disabledAt: null },
        { transaction },
      )
      await enrol(user.id, invitation, transaction)
      return { email }
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new AccessError('conflict', 'You have an account already. Sign in to accept the invitation.')
  }
}

/** Accepts an invitation as the person who is signed in, and moves there. @throws AccessError invalid, forbidden */
export async function acceptAsSignedIn(signedIn: SignedIn, token: string): Promise<void> {
  const workroomId = await inTransaction(async (transaction) => {
    const invitation = await spendToken('invitation', token, transaction)
    if (invitation.email !== signedIn.email)
      throw new AccessError(
        'forbidden',
        `This invitation is for ${invitation.email}. Sign in as that person.`,
      )
    return enrol(signedIn.userId, invitation, transaction)
  })
  await switchWorkroom(signedIn, workroomId)
}

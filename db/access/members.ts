import 'server-only'
import { Op, type Transaction } from 'sequelize'
import type * as z from 'zod'
import { invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Membership } from '../models/membership'
import { MembershipRole } from '../models/membership-role'
import { User } from '../models/user'
import { Workroom } from '../models/workroom'
import { type Actor, type Role, requireReach, roles as allRoles } from '../permissions'
import { changeRolesShape, disableMemberShape } from '../shapes/account'
import { inTransaction } from '../transactions'

export interface Member {
  readonly membershipId: string
  readonly name: string
  readonly email: string
  /** In the order of the table of permissions. */
  readonly roles: readonly Role[]
  readonly disabled: boolean
  /** Whether this is the person who asks. */
  readonly self: boolean
}

/** Everybody in the workroom, those who were disabled last. */
export async function listMembers(actor: Actor): Promise<Member[]> {
  requireReach(actor, 'members', 'read')
  const { workroomId } = actor
  const [memberships, held] = await Promise.all([
    Membership.findAll({ where: { workroomId }, order: [['createdAt', 'asc']] }),
    MembershipRole.findAll({ where: { workroomId } }),
  ])
  const users = await User.findAll({
    attributes: ['id', 'name', 'email'],
    where: { id: { [Op.in]: memberships.map((each) => each.userId) } },
  })
  const members = memberships.flatMap((membership) => {
    const user = users.find((each) => each.id === membership.userId)
    if (!user) return []
    const own = held.filter((each) => each.membershipId === membership.id).map((each) => each.role)
    return {
      membershipId: membership.id,
      name: user.name,
      email: user.email,
      roles: allRoles.filter((role) => own.includes(role)),
      disabled: membership.disabledAt !== null,
      self: membership.id === actor.membershipId,
    }
  })
  return members.sort((a, b) => Number(a.disabled) - Number(b.disabled))
}

/** The member, with the workroom locked so that two owners cannot remove each other at once. */
async function lockedMember(
  actor: Actor,
  membershipId: string,
  transaction: Transaction,
): Promise<Membership> {
  requireReach(actor, 'members', 'write')
  await Workroom.findByPk(actor.workroomId, { lock: transaction.LOCK.UPDATE, transaction })
  const membership = await Membership.findOne({
    where: { id: membershipId, workroomId: actor.workroomId },
    transaction,
  })
  if (!membership) throw notFound('member')
  return membership
}

async function requireAnotherOwner(membership: Membership, field: string, transaction: Transaction) {
  const { workroomId } = membership
  const owners = await MembershipRole.findAll({ where: { workroomId, role: 'owner' }, transaction })
  const others = owners.map((each) => each.membershipId).filter((id) => id !== membership.id)
  const active = await Membership.count({
    where: { id: { [Op.in]: others }, workroomId, disabledAt: null },
    transaction,
  })
  if (active === 0) throw invalid(field, 'A workroom needs an owner. Make somebody else an owner first.')
}

/** Replaces a member's roles; they count from their next request. @throws AccessError not-found, invalid */
export async function changeRoles(actor: Actor, input: z.input<typeof changeRolesShape>): Promise<void> {
  const { membershipId, roles } = checkInput(changeRolesShape, input)
  await inTransaction(async (transaction) => {
    const membership = await lockedMember(actor, membershipId, transaction)
    if (!roles.includes('owner')) await requireAnotherOwner(membership, 'roles', transaction)
    const { id, workroomId } = membership
    await MembershipRole.destroy({ where: { membershipId: id }, transaction })
    await MembershipRole.bulkCreate(
      roles.map((role) => ({ membershipId: id, role, workroomId })),
      { transaction },
    )
  })
}

/** Shuts a member out from the next request on, or lets them in again. @throws AccessError not-found, invalid */
export async function setMemberDisabled(
  actor: Actor,
  input: z.input<typeof disableMemberShape>,
): Promise<void> {
  const { membershipId, disabled } = checkInput(disableMemberShape, input)
  await inTransaction(async (transaction) => {
    const membership = await lockedMember(actor, membershipId, transaction)
    if (disabled) await requireAnotherOwner(membership, '', transaction)
    await membership.update({ disabledAt: disabled ? new Date() : null }, { transaction })
  })
}

import 'server-only'
import { Op } from 'sequelize'
import { Membership } from '../models/membership'
import { User } from '../models/user'
import type { Actor } from '../permissions'

/** The names of members of the actor's workroom, by membership. */
export async function memberNames(
  actor: Pick<Actor, 'workroomId'>,
  membershipIds: readonly string[],
): Promise<ReadonlyMap<string, string>> {
  if (membershipIds.length === 0) return new Map()
  const memberships = await Membership.findAll({
    attributes: ['id', 'userId'],
    where: { workroomId: actor.workroomId, id: { [Op.in]: [...new Set(membershipIds)] } },
    raw: true,
  })
  const users = await User.findAll({
    attributes: ['id', 'name'],
    where: { id: { [Op.in]: memberships.map((each) => each.userId) } },
    raw: true,
  })
  const names = new Map(users.map(({ id, name }) => [id, name]))
  return new Map(memberships.map(({ id, userId }) => [id, names.get(userId) ?? '']))
}

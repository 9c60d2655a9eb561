import 'server-only'
import { Op } from 'sequelize'
import { notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Membership } from '../models/membership'
import { Workroom } from '../models/workroom'
import { type Actor, requireReach } from '../permissions'
import { type WorkroomSettings, workroomShape } from '../shapes/workroom'
import type { SignedIn } from './sessions'

function plain(workroom: Workroom): WorkroomSettings {
  const { name, note, unit, currency, timeZone, allowances } = workroom
  return { name, note, unit, currency, timeZone, allowances }
}

/** The settings of the actor's workroom. */
export async function getWorkroom(actor: Actor): Promise<WorkroomSettings> {
  requireReach(actor, 'workroom', 'read')
  const workroom = await Workroom.findByPk(actor.workroomId)
  if (!workroom) throw notFound('workroom')
  return plain(workroom)
}

/** Replaces the settings. @throws AccessError forbidden, invalid */
export async function updateWorkroom(actor: Actor, input: WorkroomSettings): Promise<WorkroomSettings> {
  const settings = checkInput(workroomShape, input)
  requireReach(actor, 'workroom', 'write')
  const workroom = await Workroom.findByPk(actor.workroomId)
  if (!workroom) throw notFound('workroom')
  return plain(await workroom.update(settings))
}

/** Every workroom that the person may enter, by name. */
export async function listOwnWorkrooms(
  signedIn: Pick<SignedIn, 'userId'>,
): Promise<{ readonly id: string; readonly name: string }[]> {
  const memberships = await Membership.findAll({ where: { userId: signedIn.userId, disabledAt: null } })
  const workrooms = await Workroom.findAll({
    attributes: ['id', 'name'],
    where: { id: { [Op.in]: memberships.map((each) => each.workroomId) } },
    order: [
      ['name', 'asc'],
      ['id', 'asc'],
    ],
  })
  return workrooms.map(({ id, name }) => ({ id, name }))
}

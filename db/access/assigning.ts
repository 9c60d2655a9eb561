import 'server-only'
import { Op } from 'sequelize'
import { AccessError, invalid } from '../access-error'
import { Membership } from '../models/membership'
import { MembershipRole } from '../models/membership-role'
import { type Actor, requireReach } from '../permissions'
import { type DraftSummary, findDraft, summaryOf } from './drafts'
import { memberNames } from './member-names'

export interface Maker {
  readonly membershipId: string
  readonly name: string
}

/** Work is given out by whoever has all drafts of the workroom. @throws AccessError forbidden */
function requireGivingOut(actor: Actor): void {
  if (requireReach(actor, 'drafts', 'write').has('all')) return
  throw new AccessError(
    'forbidden',
    'Your role in this workroom does not allow this: its owner and drafters give out drafts.',
  )
}

/** The members that drafts can be given to, by name. @throws AccessError forbidden */
export async function listMakers(actor: Actor): Promise<Maker[]> {
  requireGivingOut(actor)
  const { workroomId } = actor
  const held = await MembershipRole.findAll({ where: { workroomId, role: 'maker' }, raw: true })
  const memberships = await Membership.findAll({
    attributes: ['id'],
    where: { workroomId, disabledAt: null, id: { [Op.in]: held.map((each) => each.membershipId) } },
    raw: true,
  })
  const names = await memberNames(
    actor,
    memberships.map(({ id }) => id),
  )
  return [...names]
    .map(([membershipId, name]) => ({ membershipId, name }))
    .sort((a, b) => a.name.localeCompare(b.name))
}

/**
 * Gives a draft to a maker to make up, who then sees it with its client and card; null takes it back.
 * @throws AccessError not-found, forbidden; invalid when the member is no maker of the workroom
 */
export async function assignDraft(
  actor: Actor,
  id: string,
  membershipId: string | null,
): Promise<DraftSummary> {
  requireGivingOut(actor)
  const draft = await findDraft(actor, id, 'write')
  const makers = membershipId === null ? [] : await listMakers(actor)
  if (membershipId !== null && !makers.some((maker) => maker.membershipId === membershipId))
    throw invalid('membershipId', 'Choose a member of this workroom who has the role of a maker.')
  return summaryOf(actor, await draft.update({ assignedTo: membershipId }, { silent: true }))
}

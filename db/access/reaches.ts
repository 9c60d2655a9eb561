import 'server-only'
import { Op, type Transaction, type WhereOptions } from 'sequelize'
import { Draft } from '../models/draft'
import { Share } from '../models/share'
import { type Action, type Actor, reachOf, requireReach } from '../permissions'

/** Drafts that a live link shows, so that students of the workroom may open them too. */
async function sharedDraftIds(actor: Actor, transaction?: Transaction): Promise<string[]> {
  const shares = await Share.findAll({
    attributes: ['draftId'],
    where: { workroomId: actor.workroomId, revokedAt: null, expiresAt: { [Op.gt]: new Date() } },
    raw: true,
    transaction,
  })
  return [...new Set(shares.map((share) => share.draftId))]
}

/** The condition that keeps a query on drafts inside what the actor may read or write. @throws AccessError forbidden */
export async function draftsWithin(
  actor: Actor,
  action: Action,
  transaction?: Transaction,
): Promise<WhereOptions<Draft>> {
  const reach = requireReach(actor, 'drafts', action)
  const { workroomId, membershipId } = actor
  if (reach.has('all')) return { workroomId }
  const ways: WhereOptions<Draft>[] = []
  if (reach.has('own')) ways.push({ madeBy: membershipId })
  if (reach.has('assigned')) ways.push({ assignedTo: membershipId })
  if (reach.has('practice')) ways.push({ madeBy: membershipId, purpose: 'practice' })
  if (reach.has('teaching')) ways.push({ purpose: 'teaching' })
  if (reach.has('shared'))
    ways.push({ purpose: 'teaching', id: { [Op.in]: await sharedDraftIds(actor, transaction) } })
  return { workroomId, [Op.or]: ways }
}

/** Clients and cards of the drafts that are assigned to a member. */
export async function assignedTo(actor: Actor, transaction?: Transaction) {
  const drafts = await Draft.findAll({
    attributes: ['clientId', 'cardId'],
    where: { workroomId: actor.workroomId, assignedTo: actor.membershipId, archivedAt: null },
    raw: true,
    transaction,
  })
  const present = (ids: (string | null)[]) => ids.filter((id): id is string => id !== null)
  return {
    clientIds: present(drafts.map((draft) => draft.clientId)),
    cardIds: present(drafts.map((draft) => draft.cardId)),
  }
}

/** Whether the actor may know for whom drafts are made: tutors and students may not. */
export function mayKnowClients(actor: Actor): boolean {
  return reachOf(actor, 'clients', 'read').size > 0
}

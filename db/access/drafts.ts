import 'server-only'
import { Op, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Client } from '../models/client'
import { Draft } from '../models/draft'
import { Revision } from '../models/revision'
import { type Actor, reachOf, requireReach } from '../permissions'
import {
  type DraftInput,
  type DraftListInput,
  type DraftPurpose,
  draftListShape,
  draftNameShape,
  draftShape,
} from '../shapes/draft'
import { inTransaction } from '../transactions'
import { getCard } from './cards'
import { getClient } from './clients'
import { knownId } from './known-id'
import { memberNames } from './member-names'
import { type Listed, containing, listed, pageWindow } from './pages'
import { draftsWithin, mayKnowClients } from './reaches'
import { type SavedRevision, plainRevision, revisionRow } from './revisions'

export interface DraftSummary {
  readonly id: string
  readonly name: string
  readonly garment: string
  readonly purpose: DraftPurpose
  /** null when the draft has no client, or when the actor may not know clients. */
  readonly clientId: string | null
  readonly clientName: string | null
  readonly cardId: string | null
  /** The member who is to make it up, and that member's name; null for tutors and students. */
  readonly assignedTo: string | null
  readonly assignedToName: string | null
  readonly archived: boolean
  readonly updatedAt: string
}

export interface DraftDetails extends DraftSummary {
  readonly head: SavedRevision
  /** Whether the actor may save versions of it. */
  readonly writable: boolean
}

async function summaries(actor: Actor, drafts: readonly Draft[]): Promise<DraftSummary[]> {
  const known = mayKnowClients(actor)
  const clientIds = drafts.flatMap((draft) => draft.clientId ?? [])
  const clients = known
    ? await Client.findAll({
        attributes: ['id', 'name'],
        where: { workroomId: actor.workroomId, id: { [Op.in]: clientIds } },
        raw: true,
      })
    : []
  const names = known
    ? await memberNames(
        actor,
        drafts.flatMap((draft) => draft.assignedTo ?? []),
      )
    : new Map()
  return drafts.map((draft) => {
    const client = clients.find((each) => each.id === draft.clientId)
    return {
      id: draft.id,
      name: draft.name,
      garment: draft.garment,
      purpose: draft.purpose,
      clientId: client?.id ?? null,
      clientName: client?.name ?? null,
      cardId: known || draft.madeBy === actor.membershipId ? draft.cardId : null,
      assignedTo: known ? draft.assignedTo : null,
      assignedToName: (draft.assignedTo && names.get(draft.assignedTo)) || null,
      archived: draft.archivedAt !== null,
      updatedAt: draft.updatedAt.toISOString(),
    }
  })
}

/** The row of a draft that the actor may read or write. @throws AccessError not-found */
export async function findDraft(actor: Actor, id: string, action: 'read' | 'write'): Promise<Draft> {
  const draft = await Draft.findOne({
    where: { [Op.and]: [await draftsWithin(actor, action), { id: knownId(id, 'draft') }] },
  })
  if (!draft) throw notFound('draft')
  return draft
}

/** One draft as lists show it. */
export async function summaryOf(actor: Actor, draft: Draft): Promise<DraftSummary> {
  const [summary] = await summaries(actor, [draft])
  if (!summary) throw notFound('draft')
  return summary
}

/** A page of the drafts that the actor may read, last changed first. */
export async function listDrafts(actor: Actor, input: DraftListInput = {}): Promise<Listed<DraftSummary>> {
  const { clientId, search, archived, page } = checkInput(draftListShape, input)
  if (clientId !== undefined) await getClient(actor, clientId)
  const wanted: WhereOptions<Draft> = {
    archivedAt: archived ? { [Op.ne]: null } : null,
    ...(clientId === undefined ? {} : { clientId }),
    ...(search === '' ? {} : { name: { [Op.like]: containing(search) } }),
  }
  const { rows, count } = await Draft.findAndCountAll({
    where: { [Op.and]: [await draftsWithin(actor, 'read'), wanted] },
    order: [
      ['updatedAt', 'desc'],
      ['id', 'desc'],
    ],
    ...pageWindow(page),
  })
  return listed(await summaries(actor, rows), count, page)
}

/** A draft with the version that counts. @throws AccessError not-found */
export async function getDraft(actor: Actor, id: string): Promise<DraftDetails> {
  const draft = await findDraft(actor, id, 'read')
  const head = await Revision.findOne({ where: { id: draft.headId, workroomId: actor.workroomId } })
  if (!head) throw notFound('draft')
  const writable =
    reachOf(actor, 'drafts', 'write').size > 0 &&
    (await Draft.count({ where: { [Op.and]: [await draftsWithin(actor, 'write'), { id: draft.id }] } })) > 0
  return { ...(await summaryOf(actor, draft)), head: plainRevision(head), writable }
}

function purposeFor(actor: Actor, asked: DraftPurpose | undefined): DraftPurpose {
  const reach = requireReach(actor, 'drafts', 'write')
  if (reach.has('all')) return asked ?? 'work'
  if (reach.has('own')) return asked ?? 'teaching'
  if (asked !== undefined && asked !== 'practice')
    throw invalid('purpose', 'You may write practice drafts only.')
  return 'practice'
}

/**
 * Starts a draft and its first version, both under ids made by the caller; the same id again is a retry.
 * @throws AccessError not-found when the client or the card is not for the actor to see; invalid when they do not match
 */
export async function createDraft(actor: Actor, input: DraftInput): Promise<DraftDetails> {
  const { id, revisionId, name, purpose, clientId, cardId, order, typed } = checkInput(draftShape, input)
  const kept = purposeFor(actor, purpose)
  if (clientId) await getClient(actor, clientId)
  if (cardId && (await getCard(actor, cardId)).clientId !== (clientId ?? null))
    throw invalid('cardId', 'This measure card is not of the chosen client.')
  const { workroomId, membershipId } = actor
  try {
    await inTransaction(async (transaction) => {
      await Draft.create(
        {
          id,
          workroomId,
          name,
          garment: order.garment,
          purpose: kept,
          clientId: clientId ?? null,
          cardId: cardId ?? null,
          madeBy: membershipId,
          assignedTo: null,
          headId: revisionId,
          archivedAt: null,
        },
        { transaction },
      )
      const first = { id: revisionId, draftId: id, basedOn: null, order, typed, kind: 'auto' } as const
      await Revision.create(revisionRow(actor, first), { transaction })
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
  return getDraft(actor, id)
}

/** @throws AccessError not-found, invalid */
export async function renameDraft(actor: Actor, id: string, name: string): Promise<DraftSummary> {
  const draft = await findDraft(actor, id, 'write')
  return summaryOf(actor, await draft.update({ name: checkInput(draftNameShape, name) }))
}

/** Takes a draft out of the lists, or back in. Nothing is lost. @throws AccessError not-found */
export async function archiveDraft(actor: Actor, id: string, archived = true): Promise<DraftSummary> {
  const draft = await findDraft(actor, id, 'write')
  return summaryOf(actor, await draft.update({ archivedAt: archived ? new Date() : null }))
}

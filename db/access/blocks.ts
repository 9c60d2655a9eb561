import 'server-only'
import { Op, UniqueConstraintError } from 'sequelize'
import type { DraftOrder } from '../../drafting/contract'
import { invalid, notFound } from '../access-error'
import { ClientBlock } from '../models/client-block'
import { Draft } from '../models/draft'
import { Revision } from '../models/revision'
import { newId } from '../new-id'
import { type Actor, requireReach } from '../permissions'
import { getClient } from './clients'
import { knownId } from './known-id'
import { draftsWithin } from './reaches'
import { readableRevision } from './revisions'

export interface Block {
  readonly clientId: string
  readonly garment: string
  readonly draftId: string
  readonly draftName: string
  /** The measure card of that draft. */
  readonly cardId: string | null
  readonly revisionId: string
  /** As the version was named; null when it was saved by itself. */
  readonly versionName: string | null
  readonly setAt: string
  readonly order: DraftOrder
}

/** A client's blocks, one for each garment at most, the last one set first. @throws AccessError not-found */
export async function listBlocks(actor: Actor, clientId: string): Promise<Block[]> {
  requireReach(actor, 'blocks', 'read')
  const client = await getClient(actor, clientId)
  const { workroomId } = actor
  const blocks = await ClientBlock.findAll({
    where: { workroomId, clientId: client.id },
    order: [
      ['setAt', 'desc'],
      ['garment', 'asc'],
    ],
  })
  const [drafts, revisions] = await Promise.all([
    Draft.findAll({ where: { workroomId, id: { [Op.in]: blocks.map(({ draftId }) => draftId) } } }),
    Revision.findAll({ where: { workroomId, id: { [Op.in]: blocks.map(({ revisionId }) => revisionId) } } }),
  ])
  return blocks.flatMap(({ garment, draftId, revisionId, setAt }): Block[] => {
    const draft = drafts.find(({ id }) => id === draftId)
    const revision = revisions.find(({ id }) => id === revisionId)
    if (!draft || !revision) return []
    const { name: draftName, cardId } = draft
    const { name: versionName, order } = revision
    const found = { garment, draftId, draftName, cardId, revisionId, versionName, order }
    return [{ clientId: client.id, ...found, setAt: setAt.toISOString() }]
  })
}

/**
 * Makes a version of a client's draft the block from which later styles start, in the place of an earlier one of the same
 * garment. The version is then kept for ever.
 * @param revisionId of the draft; the one that counts when absent
 * @throws AccessError not-found; invalid when the draft is for nobody
 */
export async function setBlock(actor: Actor, draftId: string, revisionId?: string): Promise<Block> {
  requireReach(actor, 'blocks', 'write')
  const within = await draftsWithin(actor, 'write')
  const draft = await Draft.findOne({ where: { [Op.and]: [within, { id: knownId(draftId, 'draft') }] } })
  if (!draft) throw notFound('draft')
  const revision = await readableRevision(actor, revisionId ?? draft.headId)
  if (revision.draftId !== draft.id) throw notFound('version')
  if (draft.clientId === null)
    throw invalid('draftId', 'This draft is for nobody in particular. A block belongs to a client.')
  const { workroomId, membershipId } = actor
  const where = { workroomId, clientId: draft.clientId, garment: draft.garment }
  const chosen = { draftId: draft.id, revisionId: revision.id, setBy: membershipId, setAt: new Date() }
  const [replaced] = await ClientBlock.update(chosen, { where })
  if (replaced === 0) {
    try {
      await ClientBlock.create({ id: newId(), ...where, ...chosen })
    } catch (error) {
      // Somebody set the first one at the same moment: the later choice counts.
      if (!(error instanceof UniqueConstraintError)) throw error
      await ClientBlock.update(chosen, { where })
    }
  }
  const found = (await listBlocks(actor, draft.clientId)).find(({ garment }) => garment === draft.garment)
  if (!found) throw notFound('block')
  return found
}

/** Later styles of the client start from the rules again; the draft stays. @throws AccessError not-found (the client) */
export async function removeBlock(actor: Actor, clientId: string, garment: string): Promise<void> {
  requireReach(actor, 'blocks', 'write')
  const { id } = await getClient(actor, clientId)
  await ClientBlock.destroy({
    where: { workroomId: actor.workroomId, clientId: id, garment: String(garment) },
  })
}

import 'server-only'
import { Op, type Transaction } from 'sequelize'
import type { DraftOrder } from '../../drafting/contract'
import { engineVersion } from '../../drafting/engine-version'
import { AccessError, invalid, notFound } from '../access-error'
import { contentHash } from '../canonical'
import { checkInput } from '../check-input'
import { Draft } from '../models/draft'
import { Revision } from '../models/revision'
import type { Actor } from '../permissions'
import { type RevisionInput, type RevisionKind, revisionShape } from '../shapes/revision'
import { inTransaction } from '../transactions'
import { knownId } from './known-id'
import { draftsWithin } from './reaches'

export interface RevisionSummary {
  readonly id: string
  readonly draftId: string
  readonly basedOn: string | null
  readonly kind: RevisionKind
  readonly name: string | null
  readonly engineVersion: string
  /** It was saved on top of a version that had already been followed by another: kept as a branch beside it. */
  readonly conflict: boolean
  readonly savedAt: string
  readonly printed: boolean
  readonly shared: boolean
}

export interface SavedRevision extends RevisionSummary {
  readonly order: DraftOrder
  /** What stood in each field, by field. */
  readonly typed: Readonly<Record<string, string>>
}

export interface SaveOutcome {
  readonly outcome: 'saved' | 'already-saved' | 'conflict'
  /** The version that counts now: the saved one, or on a conflict the one that came first. */
  readonly head: SavedRevision
}

function summary(revision: Revision): RevisionSummary {
  const { id, draftId, basedOn, kind, name, conflict } = revision
  return {
    id,
    draftId,
    basedOn,
    kind,
    name,
    conflict,
    engineVersion: revision.engineVersion,
    savedAt: revision.savedAt.toISOString(),
    printed: revision.printedAt !== null,
    shared: revision.sharedAt !== null,
  }
}

/** A revision as plain data. */
export function plainRevision(revision: Revision): SavedRevision {
  return { ...summary(revision), order: revision.order, typed: revision.typed }
}

/** A new row for a revision that was checked already. */
export function revisionRow(
  actor: Actor,
  revision: Omit<RevisionInput, 'basedOn'> & { basedOn: string | null },
) {
  const { id, draftId, basedOn, order, typed, kind, name } = revision
  return {
    id,
    draftId,
    basedOn,
    order,
    typed,
    kind,
    name: name ?? null,
    bodyHash: contentHash({ draftId, basedOn, order, typed, kind, name: name ?? null }),
    workroomId: actor.workroomId,
    madeBy: actor.membershipId,
    engineVersion,
    savedAt: new Date(),
    printedAt: null,
    sharedAt: null,
  }
}

async function headOf(draft: Draft, transaction: Transaction): Promise<SavedRevision> {
  const head = await Revision.findByPk(draft.headId, { transaction })
  if (!head) throw notFound('version')
  return plainRevision(head)
}

/**
 * Saves a version under an id made by the caller, on top of the version it is based on.
 * The same id with the same body is answered `already-saved`. When another version came first, this one is kept beside
 * it, marked as a conflict, and the head stays what it was.
 * @throws AccessError not-found, invalid, conflict (the id was used for something else)
 */
export async function saveRevision(actor: Actor, input: RevisionInput): Promise<SaveOutcome> {
  const revision = checkInput(revisionShape, input)
  const within = await draftsWithin(actor, 'write')
  const row = revisionRow(actor, revision)
  return inTransaction(async (transaction) => {
    // The lock makes savers of one draft wait for each other, and what is read after it is current.
    const draft = await Draft.findOne({
      where: { [Op.and]: [within, { id: revision.draftId }] },
      lock: transaction.LOCK.UPDATE,
      transaction,
    })
    if (!draft) throw notFound('draft')
    if (revision.order.garment !== draft.garment)
      throw invalid('order.garment', 'A draft keeps its garment. Start a new draft for another one.')
    const earlier = await Revision.findByPk(revision.id, { transaction })
    if (earlier) {
      if (earlier.draftId !== draft.id || earlier.bodyHash !== row.bodyHash)
        throw new AccessError('conflict', 'This version was saved before with other contents. Save it again.')
      return { outcome: 'already-saved', head: await headOf(draft, transaction) }
    }
    // A base that was thinned away meanwhile is no reason to lose the edit: it is kept beside the head like any other.
    const [moved] = await Draft.update(
      { headId: revision.id },
      { where: { id: draft.id, headId: revision.basedOn }, transaction },
    )
    const saved = await Revision.create({ ...row, conflict: moved === 0 }, { transaction })
    return moved === 0
      ? { outcome: 'conflict', head: await headOf(draft, transaction) }
      : { outcome: 'saved', head: plainRevision(saved) }
  })
}

/** All versions of a draft, newest first, without their contents. @throws AccessError not-found */
export async function listRevisions(actor: Actor, draftId: string): Promise<RevisionSummary[]> {
  const draft = await Draft.findOne({
    attributes: ['id'],
    where: { [Op.and]: [await draftsWithin(actor, 'read'), { id: knownId(draftId, 'draft') }] },
  })
  if (!draft) throw notFound('draft')
  const revisions = await Revision.findAll({
    attributes: { exclude: ['order', 'typed'] },
    where: { draftId: draft.id, workroomId: actor.workroomId },
    order: [
      ['savedAt', 'desc'],
      ['id', 'desc'],
    ],
  })
  return revisions.map(summary)
}

/** The row of a version that the actor may read. @throws AccessError not-found */
export async function readableRevision(actor: Actor, id: string): Promise<Revision> {
  const within = await draftsWithin(actor, 'read')
  const revision = await Revision.findOne({
    where: { id: knownId(id, 'version'), workroomId: actor.workroomId },
  })
  const draft =
    revision &&
    (await Draft.findOne({ attributes: ['id'], where: { [Op.and]: [within, { id: revision.draftId }] } }))
  if (!revision || !draft) throw notFound('version')
  return revision
}

/** One version with its contents. @throws AccessError not-found */
export async function getRevision(actor: Actor, id: string): Promise<SavedRevision> {
  return plainRevision(await readableRevision(actor, id))
}

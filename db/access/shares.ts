import 'server-only'
import { Op, UniqueConstraintError } from 'sequelize'
import type { DraftOrder } from '../../drafting/contract'
import { invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { endOfDay } from '../days'
import { Draft } from '../models/draft'
import { Revision } from '../models/revision'
import { Share } from '../models/share'
import { Workroom } from '../models/workroom'
import { type Actor, requireReach } from '../permissions'
import { secretToken, tokenHash } from '../secret-tokens'
import { type ShareInput, type ShareScope, shareShape } from '../shapes/share'
import { knownId } from './known-id'
import { draftsWithin } from './reaches'

export interface ShareDetails {
  readonly id: string
  readonly draftId: string
  readonly scope: ShareScope
  /** YYYY-MM-DD: the last day on which the link works. */
  readonly expiresOn: string
  readonly state: 'live' | 'expired' | 'revoked'
  readonly createdAt: string
}

/** What a link opens. The order is for the server to draw from: it holds the body's measurements. */
export interface OpenedShare {
  readonly scope: ShareScope
  readonly workroomId: string
  readonly draftName: string
  readonly workroomName: string
  /** Of the workroom. */
  readonly timeZone: string
  readonly order: DraftOrder
  readonly revisionId: string
  readonly savedAt: string
}

function plain(share: Share): ShareDetails {
  const { id, draftId, scope, expiresOn } = share
  const state = share.revokedAt ? 'revoked' : share.expiresAt.getTime() <= Date.now() ? 'expired' : 'live'
  return { id, draftId, scope, expiresOn, state, createdAt: share.createdAt.toISOString() }
}

async function shareableDraft(actor: Actor, draftId: string, action: 'read' | 'write'): Promise<Draft> {
  requireReach(actor, 'shares', action)
  const draft = await Draft.findOne({
    where: { [Op.and]: [await draftsWithin(actor, 'write'), { id: knownId(draftId, 'draft') }] },
  })
  if (!draft) throw notFound('draft')
  return draft
}

const year = 366 * 24 * 3600 * 1000

/**
 * Makes a link under an id made by the caller; the same id again gives the same link.
 * The link shows the draft's newest version as it is when it is opened.
 * @throws AccessError not-found; invalid when the last day is past or more than a year away
 */
export async function createShare(
  actor: Actor,
  input: ShareInput,
): Promise<{ share: ShareDetails; token: string }> {
  const { id, draftId, scope, expiresOn } = checkInput(shareShape, input)
  const draft = await shareableDraft(actor, draftId, 'write')
  const workroom = await Workroom.findByPk(actor.workroomId, { rejectOnEmpty: true })
  const expiresAt = endOfDay(expiresOn, workroom.timeZone)
  const ahead = expiresAt.getTime() - Date.now()
  if (ahead <= 0) throw invalid('expiresOn', 'This day is past. Choose today or a later day.')
  if (ahead > year) throw invalid('expiresOn', 'A link lasts at most a year.')
  const token = secretToken('share', id)
  const share = {
    id,
    workroomId: actor.workroomId,
    draftId: draft.id,
    tokenHash: tokenHash(token),
    scope,
    expiresOn,
    expiresAt,
    revokedAt: null,
    madeBy: actor.membershipId,
    createdAt: new Date(),
  }
  try {
    await Share.create(share)
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
  const made = await Share.findOne({ where: { id, draftId: draft.id, workroomId: actor.workroomId } })
  if (!made) throw notFound('link')
  await Revision.update({ sharedAt: new Date() }, { where: { id: draft.headId, sharedAt: null } })
  return { share: plain(made), token }
}

/** All links of a draft, newest first. @throws AccessError not-found */
export async function listShares(actor: Actor, draftId: string): Promise<ShareDetails[]> {
  const draft = await shareableDraft(actor, draftId, 'read')
  const shares = await Share.findAll({
    where: { draftId: draft.id, workroomId: actor.workroomId },
    order: [
      ['createdAt', 'desc'],
      ['id', 'desc'],
    ],
  })
  return shares.map(plain)
}

/** Ends a link at once. Ending it again changes nothing. @throws AccessError not-found */
export async function revokeShare(actor: Actor, id: string): Promise<ShareDetails> {
  requireReach(actor, 'shares', 'write')
  const share = await Share.findOne({ where: { id: knownId(id, 'link'), workroomId: actor.workroomId } })
  if (!share) throw notFound('link')
  await shareableDraft(actor, share.draftId, 'write')
  return plain(share.revokedAt ? share : await share.update({ revokedAt: new Date() }))
}

/** What a link opens, or null when it is unknown, expired or revoked. Nothing about the client is in it. */
export async function openShare(token: string): Promise<OpenedShare | null> {
  if (typeof token !== 'string' || !/^[\w-]{43}$/.test(token)) return null
  const share = await Share.findOne({
    where: { tokenHash: tokenHash(token), revokedAt: null, expiresAt: { [Op.gt]: new Date() } },
  })
  if (!share) return null
  const [draft, workroom] = await Promise.all([
    Draft.findOne({ where: { id: share.draftId, workroomId: share.workroomId } }),
    Workroom.findByPk(share.workroomId),
  ])
  const head = draft && (await Revision.findByPk(draft.headId))
  if (!draft || !workroom || !head) return null
  // What somebody has seen by a link is never thinned away.
  if (!head.sharedAt) await head.update({ sharedAt: new Date() })
  return {
    scope: share.scope,
    workroomId: share.workroomId,
    draftName: draft.name,
    workroomName: workroom.name,
    timeZone: workroom.timeZone,
    order: head.order,
    revisionId: head.id,
    savedAt: head.savedAt.toISOString(),
  }
}

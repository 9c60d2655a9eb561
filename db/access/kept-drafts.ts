import 'server-only'
import { promisify } from 'node:util'
import { gunzip, gzip } from 'node:zlib'
import { UniqueConstraintError } from 'sequelize'
import type { Draft } from '../../drafting/contract'
import { KeptDraft } from '../models/kept-draft'
import { Revision } from '../models/revision'
import type { Actor } from '../permissions'
import { readableRevision } from './revisions'
import type { OpenedShare } from './shares'

const pack = promisify(gzip)
const unpack = promisify(gunzip)

/** A version's whole Draft as it was first printed or shared. */
export interface KeptVersion {
  readonly draft: Draft
  readonly keptAt: string
}

/** What was kept first stays: it is what was cut. */
async function keep(revisionId: string, workroomId: string, draft: Draft): Promise<void> {
  if ((await KeptDraft.count({ where: { revisionId } })) > 0) return
  const { engineVersion } = draft
  const drafted = await pack(JSON.stringify(draft))
  try {
    await KeptDraft.create({ revisionId, workroomId, engineVersion, drafted, keptAt: new Date() })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
}

async function keptOf(revisionId: string): Promise<KeptVersion | null> {
  const kept = await KeptDraft.findByPk(revisionId)
  if (!kept) return null
  const draft = JSON.parse((await unpack(kept.drafted)).toString('utf8')) as Draft
  return { draft, keptAt: kept.keptAt.toISOString() }
}

/**
 * Marks a version as printed and keeps its whole Draft, so that what was cut can always be printed again. What was kept
 * first stays.
 * @throws AccessError not-found
 */
export async function keepPrinted(
  actor: Actor,
  { revisionId, draft }: { readonly revisionId: string; readonly draft: Draft },
): Promise<void> {
  const revision = await readableRevision(actor, revisionId)
  await Revision.update({ printedAt: new Date() }, { where: { id: revision.id, printedAt: null } })
  await keep(revision.id, actor.workroomId, draft)
}

/** The Draft as it was printed or shared, or null when this version never was. @throws AccessError not-found */
export async function keptDraft(actor: Actor, revisionId: string): Promise<KeptVersion | null> {
  const revision = await readableRevision(actor, revisionId)
  return keptOf(revision.id)
}

/** The same for whoever opened a link. */
export function keptByLink({ revisionId }: OpenedShare): Promise<KeptVersion | null> {
  return keptOf(revisionId)
}

/** Keeps what a visitor was shown, so that it can be printed later as it was seen. */
export function keepByLink({ revisionId, workroomId }: OpenedShare, draft: Draft): Promise<void> {
  return keep(revisionId, workroomId, draft)
}

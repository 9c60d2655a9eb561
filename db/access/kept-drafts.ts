import 'server-only'
import { promisify } from 'node:util'
import { gunzip, gzip } from 'node:zlib'
import { UniqueConstraintError } from 'sequelize'
import type { Draft } from '../../drafting/contract'
import { KeptDraft } from '../models/kept-draft'
import { Revision } from '../models/revision'
import type { Actor } from '../permissions'
import { readableRevision } from './revisions'

const pack = promisify(gzip)
const unpack = promisify(gunzip)

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
  if ((await KeptDraft.count({ where: { revisionId: revision.id } })) > 0) return
  try {
    await KeptDraft.create({
      revisionId: revision.id,
      workroomId: actor.workroomId,
      engineVersion: draft.engineVersion,
      drafted: await pack(JSON.stringify(draft)),
      keptAt: new Date(),
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
}

/** The Draft as it was printed, or null when this version never was. @throws AccessError not-found */
export async function keptDraft(actor: Actor, revisionId: string): Promise<Draft | null> {
  const revision = await readableRevision(actor, revisionId)
  const kept = await KeptDraft.findByPk(revision.id)
  return kept ? (JSON.parse((await unpack(kept.drafted)).toString('utf8')) as Draft) : null
}

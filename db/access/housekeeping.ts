import 'server-only'
import { Op, QueryTypes } from 'sequelize'
import { connection } from '../connection'
import { Attempt } from '../models/attempt'
import { Job } from '../models/job'
import { Session } from '../models/session'
import { Token } from '../models/token'

const day = 24 * 3_600_000

/**
 * Thins automatic versions older than a day to the last one of each hour. Named, printed and shared ones, branches of a
 * conflict, clients' blocks and the one that counts stay for ever.
 */
export async function thinRevisions(now = new Date()): Promise<void> {
  await connection.query(
    `DELETE FROM revisions WHERE id IN (
       SELECT id FROM (
         SELECT r.id, ROW_NUMBER() OVER (
           PARTITION BY r.draftId, DATE_FORMAT(r.savedAt, '%Y%m%d%H') ORDER BY r.savedAt DESC, r.id DESC
         ) AS place
         FROM revisions r JOIN drafts d ON d.id = r.draftId AND d.headId <> r.id
         LEFT JOIN client_blocks b ON b.revisionId = r.id
         WHERE b.id IS NULL AND r.kind = 'auto' AND r.conflict = 0 AND r.printedAt IS NULL AND r.sharedAt IS NULL
           AND r.savedAt < :before
       ) AS placed WHERE place > 1
     )`,
    { type: QueryTypes.DELETE, replacements: { before: new Date(now.getTime() - day) } },
  )
}

/** Forgets what has served: used links, ended sessions, counters, finished jobs. */
export async function forgetOld(now = new Date()): Promise<void> {
  const before = (days: number) => ({ [Op.lt]: new Date(now.getTime() - days * day) })
  await Token.destroy({ where: { expiresAt: before(30) } })
  await Session.destroy({ where: { [Op.or]: [{ endedAt: before(30) }, { startedAt: before(90) }] } })
  await Attempt.destroy({ where: { windowEnds: before(1) } })
  await Job.destroy({ where: { doneAt: before(30) } })
}

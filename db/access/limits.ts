import 'server-only'
import { createHash } from 'node:crypto'
import { QueryTypes } from 'sequelize'
import { AccessError } from '../access-error'
import { connection } from '../connection'
import { Attempt } from '../models/attempt'
import { inTransaction } from '../transactions'

/** How many tries a window allows. All limits of the product stand here. */
const limits = {
  'sign-in account': { tries: 10, minutes: 15 },
  'sign-in address': { tries: 60, minutes: 15 },
  'mail account': { tries: 5, minutes: 60 },
  'mail address': { tries: 60, minutes: 60 },
  'invitations of workroom': { tries: 50, minutes: 60 },
  'token address': { tries: 60, minutes: 15 },
} as const
export type Limit = keyof typeof limits

const subjectHash = (subject: string) => createHash('sha256').update(subject).digest('hex')

/** Counts a try. The row stays locked until it is read, so that of several at once each gets a number of its own. */
async function count(limit: Limit, subject: string): Promise<{ count: number; windowEnds: Date }> {
  const where = { scope: limit, subject: subjectHash(subject) }
  const now = new Date()
  const replacements = { ...where, now, ends: new Date(now.getTime() + limits[limit].minutes * 60_000) }
  return inTransaction(async (transaction) => {
    await connection.query(
      `INSERT INTO attempts (scope, subject, windowEnds, count) VALUES (:scope, :subject, :ends, 1)
       ON DUPLICATE KEY UPDATE count = IF(windowEnds <= :now, 1, count + 1),
         windowEnds = IF(windowEnds <= :now, :ends, windowEnds)`,
      { replacements, type: QueryTypes.INSERT, transaction },
    )
    return Attempt.findOne({ where, rejectOnEmpty: true, transaction })
  })
}

/**
 * Counts a try and refuses it when there were too many. When the counters cannot be reached, it is refused as well.
 * @throws AccessError limited, unavailable
 */
export async function takeTry(limit: Limit, subject: string): Promise<void> {
  const tried = await count(limit, subject).catch(() => {
    throw new AccessError('unavailable', 'This cannot be checked at the moment. Try again in a minute.')
  })
  if (tried.count <= limits[limit].tries) return
  const minutes = Math.max(1, Math.ceil((tried.windowEnds.getTime() - Date.now()) / 60_000))
  throw new AccessError(
    'limited',
    `Too many tries. Try again in ${minutes === 1 ? 'a minute' : `${minutes} minutes`}.`,
  )
}

/** Gives back what a success has used up: all tries of the account, one of the address. */
export async function giveBack(limit: Limit, subject: string, all: boolean): Promise<void> {
  const where = { scope: limit, subject: subjectHash(subject) }
  if (all) await Attempt.destroy({ where })
  else await Attempt.decrement('count', { by: 1, where })
}

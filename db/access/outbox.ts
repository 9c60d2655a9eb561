import 'server-only'
import type { Transaction } from 'sequelize'
import { Job } from '../models/job'
import { newId } from '../new-id'

/** What may be asked for in the background, and what each kind needs to know. Secrets and lengths stay out of it. */
export interface JobPayloads {
  /** Confirm the address of somebody who joins. */
  'mail-join': { readonly email: string; readonly name: string; readonly workroomName: string }
  /** A new password was asked for. */
  'mail-reset': { readonly email: string }
  'mail-password-changed': { readonly email: string; readonly name: string }
  'mail-invitation': { readonly tokenId: string }
  /** Thinning of automatic versions, and what has been kept long enough. */
  housekeeping: Record<string, never>
}
export type JobKind = keyof JobPayloads

/** Writes a job in the transaction that wants it done: no commit, no mail. @returns the job's id */
export async function enqueue<K extends JobKind>(
  kind: K,
  payload: JobPayloads[K],
  options: {
    readonly workroomId?: string
    readonly runAfter?: Date
    readonly transaction?: Transaction
  } = {},
): Promise<string> {
  const now = new Date()
  const job = await Job.create(
    {
      id: newId(),
      kind,
      payload: { ...payload },
      workroomId: options.workroomId ?? null,
      createdAt: now,
      runAfter: options.runAfter ?? now,
      leaseOwner: null,
      leaseUntil: null,
      doneAt: null,
      failedAt: null,
      lastError: null,
    },
    { transaction: options.transaction },
  )
  return job.id
}

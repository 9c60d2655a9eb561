import 'server-only'
import { Op, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { v5 } from 'uuid'
import { connection } from '../connection'
import { Job } from '../models/job'
import type { JobKind, JobPayloads } from './outbox'

/** Longer than any job takes; afterwards somebody else may do it again. */
const lease = 120_000
const mostAttempts = 10

/** A job that this runner holds. */
export type ClaimedJob = {
  [K in JobKind]: {
    readonly id: string
    readonly kind: K
    readonly payload: JobPayloads[K]
    readonly attempts: number
  }
}[JobKind]

const waiting = (now: Date): WhereOptions<Job> => ({
  doneAt: null,
  failedAt: null,
  runAfter: { [Op.lte]: now },
  leaseUntil: { [Op.or]: [null, { [Op.lt]: now }] },
})

/**
 * Takes the next job that is due, or null. The UPDATE repeats the conditions, so that of two runners one gets it.
 * @param owner id of the runner
 */
export async function claimJob(owner: string): Promise<ClaimedJob | null> {
  const now = new Date()
  const due = await Job.findAll({ where: waiting(now), order: [['runAfter', 'asc']], limit: 5 })
  for (const job of due) {
    const [claimed] = await Job.update(
      {
        leaseOwner: owner,
        leaseUntil: new Date(now.getTime() + lease),
        attempts: connection.literal('attempts + 1') as unknown as number,
      },
      { where: { [Op.and]: [{ id: job.id }, waiting(now)] } },
    )
    if (claimed === 1)
      return { id: job.id, kind: job.kind, payload: job.payload, attempts: job.attempts + 1 } as ClaimedJob
  }
  return null
}

/** Done: who it was about need not be kept. */
export async function finishJob(id: string, owner: string): Promise<void> {
  await Job.update(
    { doneAt: new Date(), payload: {}, leaseUntil: null },
    { where: { id, leaseOwner: owner } },
  )
}

/** Puts a job back for later: 5 s, 20 s, 80 s… at most six hours; after ten attempts it is given up. */
export async function postponeJob(job: ClaimedJob, owner: string, reason: string): Promise<void> {
  const now = Date.now()
  const delay = Math.min(5000 * 4 ** (job.attempts - 1), 6 * 3_600_000)
  await Job.update(
    {
      leaseUntil: null,
      lastError: reason.slice(0, 200),
      runAfter: new Date(now + delay),
      failedAt: job.attempts >= mostAttempts ? new Date(now) : null,
    },
    { where: { id: job.id, leaseOwner: owner } },
  )
}

const everyHour = '6d3c2f0e-4c1b-5f0a-9a53-0f6b7f5d1c11'

/** Puts this hour's housekeeping in the queue; all processes name it alike, so that it stands there once. */
export async function enqueueHousekeeping(now = new Date()): Promise<void> {
  const hour = now.toISOString().slice(0, 13)
  try {
    await Job.create({
      id: v5(`housekeeping ${hour}`, everyHour),
      kind: 'housekeeping',
      payload: {},
      workroomId: null,
      createdAt: now,
      runAfter: now,
      leaseOwner: null,
      leaseUntil: null,
      doneAt: null,
      failedAt: null,
      lastError: null,
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
}

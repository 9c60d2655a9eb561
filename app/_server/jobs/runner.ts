import 'server-only'
import { type ClaimedJob, claimJob, enqueueHousekeeping, finishJob, postponeJob } from '@/db/access/job-queue'
import { newId } from '@/db/new-id'
import { log } from '../log'
import { perform } from './perform'

declare global {
  var chalkfoldRunner: NodeJS.Timeout | undefined
}

const idlePause = 1000
/** Mails wait mostly for the other side: several at a time, so that one slow answer does not hold up the rest. */
const atOnce = 4

async function attempt(job: ClaimedJob, owner: string): Promise<void> {
  const about = { job: job.id, kind: job.kind, attempts: job.attempts }
  try {
    await perform(job)
    await finishJob(job.id, owner)
    log.info(about, 'job done')
  } catch (error) {
    // The message may quote an address; only the kind of error is written down.
    const { code, name } = error as { code?: string; name?: string }
    const reason = code ?? name ?? 'error'
    log.warn({ ...about, reason }, 'job postponed')
    await postponeJob(job, owner, reason)
  }
}

/** Does everything that is due, several at a time. @returns how many jobs were tried */
export async function runDueJobs(owner: string = newId()): Promise<number> {
  let done = 0
  const hand = async () => {
    for (let job = await claimJob(owner); job; job = await claimJob(owner)) {
      await attempt(job, owner)
      done += 1
    }
  }
  await Promise.all(Array.from({ length: atOnce }, hand))
  return done
}

/** Starts the one runner of this process; it looks for due jobs every second. */
export function startRunner(): void {
  if (globalThis.chalkfoldRunner) return
  const owner = newId()
  let hour = -1
  const turn = async () => {
    try {
      const now = new Date()
      if (now.getUTCHours() !== hour) {
        await enqueueHousekeeping(now)
        hour = now.getUTCHours()
      }
      await runDueJobs(owner)
    } catch (error) {
      log.error({ reason: (error as Error).name }, 'jobs cannot be reached')
    }
    globalThis.chalkfoldRunner = setTimeout(() => void turn(), idlePause).unref()
  }
  globalThis.chalkfoldRunner = setTimeout(() => void turn(), idlePause).unref()
}

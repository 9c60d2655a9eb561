import 'server-only'
import { forgetOld, thinRevisions } from '@/db/access/housekeeping'
import type { ClaimedJob } from '@/db/access/job-queue'
import type { Letter } from '../mail/letter'
import { invitationLetter, joinLetter, passwordChangedLetter, resetLetter } from '../mail/letters'
import { sendLetter } from '../mail/send'

async function letterFor(job: ClaimedJob): Promise<Letter | null> {
  switch (job.kind) {
    case 'mail-join':
      return joinLetter(job.id, job.payload)
    case 'mail-reset':
      return resetLetter(job.id, job.payload)
    case 'mail-password-changed':
      return passwordChangedLetter(job.payload)
    case 'mail-invitation':
      return invitationLetter(job.payload)
    case 'housekeeping':
      return null
  }
}

/** Does a job. Doing it again after a crash does no harm. @throws Error when it has to be tried again */
export async function perform(job: ClaimedJob): Promise<void> {
  if (job.kind === 'housekeeping') {
    await thinRevisions()
    await forgetOld()
    return
  }
  const letter = await letterFor(job)
  if (letter) await sendLetter(letter, job.id)
}

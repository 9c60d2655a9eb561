import { Attempt } from '@/db/models/attempt'

/** Empties the counters, so that what one test tried is not held against the next. */
export async function forgetTries(): Promise<void> {
  await Attempt.destroy({ where: {} })
}

import 'server-only'
import { serverProblems } from '@/db/access/server-settings'
import { dropClaimedAddresses } from './address'
import { assertSettings } from './config'
import { startRunner } from './jobs/runner'
import { log } from './log'

/**
 * Once, before the first request: refuses to start with unsafe settings, then starts the background work. A database
 * that cannot be reached yet does not stop the start: requests answer 503 until it is there.
 * @throws Error naming what has to be changed
 */
export async function start(): Promise<void> {
  assertSettings()
  dropClaimedAddresses()
  const problems = await serverProblems().catch((error: Error) => {
    log.error({ reason: error.name }, 'database unreachable at start')
    return []
  })
  if (problems.length > 0) throw new Error(`The database is not safe to save in:\n${problems.join('\n')}`)
  startRunner()
}

import 'server-only'
import { notFound } from '../access-error'
import { Session } from '../models/session'
import { knownId } from './known-id'
import { type SignedIn, livingSessions } from './sessions'

export interface OwnSession {
  readonly id: string
  /** In words, such as 'Firefox on Windows'; '' when it is not known. */
  readonly device: string
  readonly startedAt: string
  readonly lastSeenAt: string
  /** Whether it is the one that asks. */
  readonly here: boolean
}

/** Where the person is signed in: this session first, then the one seen last. */
export async function listOwnSessions(
  signedIn: Pick<SignedIn, 'sessionId' | 'userId'>,
): Promise<OwnSession[]> {
  const sessions = await Session.findAll({
    where: { ...livingSessions(new Date()), userId: signedIn.userId },
    order: [
      ['lastSeenAt', 'desc'],
      ['id', 'desc'],
    ],
  })
  return sessions
    .map(({ id, device, startedAt, lastSeenAt }) => ({
      id,
      device,
      startedAt: startedAt.toISOString(),
      lastSeenAt: lastSeenAt.toISOString(),
      here: id === signedIn.sessionId,
    }))
    .sort((a, b) => Number(b.here) - Number(a.here))
}

/** Signs the person out on one device, from its next request on. @throws AccessError not-found */
export async function endOwnSession(
  signedIn: Pick<SignedIn, 'sessionId' | 'userId'>,
  id: string,
): Promise<void> {
  const [ended] = await Session.update(
    { endedAt: new Date() },
    { where: { id: knownId(id, 'session'), userId: signedIn.userId, endedAt: null } },
  )
  if (ended === 0) throw notFound('session')
}

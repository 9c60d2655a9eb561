import 'server-only'
import { Op, QueryTypes, type Transaction, type WhereOptions } from 'sequelize'
import { notFound } from '../access-error'
import { connection } from '../connection'
import { Membership } from '../models/membership'
import { Session } from '../models/session'
import { newId } from '../new-id'
import { type Actor, type Role, roles } from '../permissions'
import type { Unit } from '../shapes/length'
import { knownId } from './known-id'

const minute = 60_000
const day = 24 * 60 * minute
/** A session ends when it was not used for so long, and at the latest so long after sign-in. */
const idleLimit = 14 * day
const absoluteLimit = 60 * day

/** The condition that a session still counts: not ended, used not too long ago, not too old. */
export function livingSessions(now: Date): WhereOptions<Session> {
  return {
    endedAt: null,
    lastSeenAt: { [Op.gt]: new Date(now.getTime() - idleLimit) },
    startedAt: { [Op.gt]: new Date(now.getTime() - absoluteLimit) },
  }
}

/** Who is signed in, whether or not they still belong to a workroom. */
export interface SignedIn {
  readonly sessionId: string
  readonly userId: string
  readonly userName: string
  readonly email: string
  /** null when the membership of the session's workroom has ended. */
  readonly actor: Actor | null
  readonly workroom: { readonly id: string; readonly name: string; readonly unit: Unit } | null
}

interface Row {
  readonly userId: string
  readonly userName: string
  readonly email: string
  readonly lastSeenAt: Date
  readonly workroomId: string | null
  readonly workroomName: string | null
  readonly unit: Unit | null
  readonly membershipId: string | null
  readonly roles: string | null
}

/**
 * Starts a session in the workroom that the person used last.
 * @param device in words
 * @returns its id
 */
export async function startSession(userId: string, device = ''): Promise<string> {
  const latest = await Session.findOne({
    where: { userId, workroomId: { [Op.ne]: null } },
    order: [['lastSeenAt', 'desc']],
  })
  const memberships = await Membership.findAll({
    where: { userId, disabledAt: null },
    order: [['createdAt', 'asc']],
  })
  const usual = memberships.find((each) => each.workroomId === latest?.workroomId) ?? memberships[0]
  return openSession({ userId, workroomId: usual?.workroomId ?? null, device })
}

async function openSession(
  about: { readonly userId: string; readonly workroomId: string | null; readonly device: string },
  transaction?: Transaction,
): Promise<string> {
  const now = new Date()
  const { id } = await Session.create(
    { id: newId(), ...about, startedAt: now, lastSeenAt: now, endedAt: null },
    { transaction },
  )
  return id
}

async function rowFor(sessionId: string, now: Date): Promise<Row | undefined> {
  const [row] = await connection.query<Row>(
    `SELECT u.id AS userId, u.name AS userName, u.email, s.lastSeenAt, w.id AS workroomId, w.name AS workroomName,
       w.unit, m.id AS membershipId,
       (SELECT GROUP_CONCAT(r.role) FROM membership_roles r WHERE r.membershipId = m.id) AS roles
     FROM sessions s
     JOIN users u ON u.id = s.userId AND u.disabledAt IS NULL
     LEFT JOIN memberships m ON m.userId = u.id AND m.workroomId = s.workroomId AND m.disabledAt IS NULL
     LEFT JOIN workrooms w ON w.id = m.workroomId
     WHERE s.id = :sessionId AND s.endedAt IS NULL AND s.lastSeenAt > :idle AND s.startedAt > :oldest`,
    {
      type: QueryTypes.SELECT,
      replacements: {
        sessionId,
        idle: new Date(now.getTime() - idleLimit),
        oldest: new Date(now.getTime() - absoluteLimit),
      },
    },
  )
  return row
}

/**
 * Who is behind a session at this moment, or null when it has ended. Asked on every request: signing out, a new
 * password, a lost role and a disabled member count from the next request on.
 */
export async function signedInBy(sessionId: string): Promise<SignedIn | null> {
  const now = new Date()
  const row = await rowFor(sessionId, now)
  if (!row) return null
  if (now.getTime() - new Date(row.lastSeenAt).getTime() > minute)
    await Session.update({ lastSeenAt: now }, { where: { id: sessionId, endedAt: null } })
  const { userId, userName, email, workroomId, membershipId, workroomName, unit } = row
  const held = (row.roles ?? '').split(',')
  const known: Role[] = roles.filter((role) => held.includes(role))
  const member = workroomId !== null && membershipId !== null && known.length > 0
  return {
    sessionId,
    userId,
    userName,
    email,
    actor: member ? { userId, workroomId, membershipId, roles: known, sessionId } : null,
    workroom:
      member && workroomName !== null && unit !== null ? { id: workroomId, name: workroomName, unit } : null,
  }
}

/** Ends one session. */
export async function endSession(sessionId: string): Promise<void> {
  await Session.update({ endedAt: new Date() }, { where: { id: sessionId, endedAt: null } })
}

/** Ends every session of a person, on every device. */
export async function endAllSessions(userId: string, transaction?: Transaction): Promise<void> {
  await Session.update({ endedAt: new Date() }, { where: { userId, endedAt: null }, transaction })
}

/**
 * Ends every session of a person and starts a new one in the workroom of this one: what was copied from any device is
 * worth nothing, and this device goes on. @returns its id
 */
export async function replaceSessions(
  { sessionId, userId, workroom }: Pick<SignedIn, 'sessionId' | 'userId' | 'workroom'>,
  transaction: Transaction,
): Promise<string> {
  const before = await Session.findOne({ where: { id: sessionId, userId }, transaction })
  await endAllSessions(userId, transaction)
  const about = { userId, workroomId: workroom?.id ?? null, device: before?.device ?? '' }
  return openSession(about, transaction)
}

/** Moves a session to another workroom of the same person. @throws AccessError not-found */
export async function switchWorkroom(
  signedIn: Pick<SignedIn, 'sessionId' | 'userId'>,
  workroomId: string,
): Promise<void> {
  const membership = await Membership.findOne({
    where: { workroomId: knownId(workroomId, 'workroom'), userId: signedIn.userId, disabledAt: null },
  })
  if (!membership) throw notFound('workroom')
  await Session.update(
    { workroomId: membership.workroomId },
    { where: { id: signedIn.sessionId, userId: signedIn.userId, endedAt: null } },
  )
}

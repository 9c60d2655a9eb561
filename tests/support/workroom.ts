import { startSession } from '@/db/access/sessions'
import { Membership } from '@/db/models/membership'
import { MembershipRole } from '@/db/models/membership-role'
import { User } from '@/db/models/user'
import { Workroom } from '@/db/models/workroom'
import { newId } from '@/db/new-id'
import { hashPassword } from '@/db/passwords'
import type { Actor, Role } from '@/db/permissions'
import { usualAllowances } from '@/db/shapes/workroom'

export const testPassword = 'plum tree by the river'
let encoded: Promise<string> | undefined

export interface Person {
  readonly actor: Actor
  readonly email: string
  readonly name: string
}

export interface TestWorkroom {
  readonly id: string
  readonly name: string
  readonly person: (...roles: Role[]) => Promise<Person>
}

async function addPerson(workroomId: string, roles: readonly Role[]): Promise<Person> {
  const [userId, membershipId] = [newId(), newId()]
  const email = `${roles.join('-')}-${userId}@people.example`
  const name = `Test ${roles.join(' and ')}`
  const passwordHash = await (encoded ??= hashPassword(testPassword))
  await User.create({ id: userId, email, name, passwordHash, disabledAt: null })
  await Membership.create({ id: membershipId, workroomId, userId, disabledAt: null })
  await MembershipRole.bulkCreate(roles.map((role) => ({ membershipId, role, workroomId })))
  const sessionId = await startSession(userId)
  return { actor: { userId, workroomId, membershipId, roles, sessionId }, email, name }
}

/** A new workroom of its own for a test; `person` adds a signed-in member with these roles. */
export async function makeWorkroom(): Promise<TestWorkroom> {
  const id = newId()
  const name = `Workroom ${id.slice(-6)}`
  await Workroom.create({
    id,
    name,
    note: '',
    unit: 'in',
    currency: 'GBP',
    timeZone: 'Africa/Lagos',
    allowances: usualAllowances,
  })
  return { id, name, person: (...roles) => addPerson(id, roles) }
}

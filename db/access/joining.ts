import 'server-only'
import { UniqueConstraintError } from 'sequelize'
import type * as z from 'zod'
import { AccessError } from '../access-error'
import { checkInput } from '../check-input'
import { Membership } from '../models/membership'
import { MembershipRole } from '../models/membership-role'
import { User } from '../models/user'
import { Workroom } from '../models/workroom'
import { newId } from '../new-id'
import { hashPassword } from '../passwords'
import { secretToken } from '../secret-tokens'
import { confirmJoinShape, joinShape } from '../shapes/account'
import { usualAllowances } from '../shapes/workroom'
import { inTransaction } from '../transactions'
import { takeTry } from './limits'
import { type JobPayloads, enqueue } from './outbox'
import { issueToken, liveToken, spendToken } from './tokens'

/**
 * Asks to join with a new workroom. The answer is the same whether or not the address is known: what happens next
 * is in the mail that goes to it.
 * @throws AccessError invalid, limited
 */
export async function requestJoin(input: z.input<typeof joinShape>, address: string): Promise<void> {
  const { email, name, workroomName } = checkInput(joinShape, input)
  await takeTry('mail address', address)
  await takeTry('mail account', email)
  await enqueue('mail-join', { email, name, workroomName })
}

/** For the mail: the link to confirm by, or null when somebody with this address has joined already. */
export async function joinLink(jobId: string, wanted: JobPayloads['mail-join']): Promise<string | null> {
  if ((await User.count({ where: { email: wanted.email } })) > 0) return null
  const { name, workroomName, email } = wanted
  await issueToken('join', jobId, { email, details: { name, workroomName } })
  return secretToken('join', jobId)
}

/** What the link of a mail would create, or null when it was used or has expired. */
export async function openJoin(
  token: string,
): Promise<{ readonly email: string; readonly name: string; readonly workroomName: string } | null> {
  const found = await liveToken('join', token)
  if (!found) return null
  return {
    email: found.email,
    name: found.details.name ?? '',
    workroomName: found.details.workroomName ?? '',
  }
}

/**
 * Makes the person, the workroom and the owner's membership, all or nothing.
 * @throws AccessError invalid (password, used link), conflict (joined meanwhile)
 */
export async function confirmJoin(input: z.input<typeof confirmJoinShape>): Promise<{ email: string }> {
  const { token, password, unit, timeZone } = checkInput(confirmJoinShape, input)
  const passwordHash = await hashPassword(password)
  try {
    return await inTransaction(async (transaction) => {
      const { email, details } = await spendToken('join', token, transaction)
      const user = await User.create(
        { id: newId(), email, name: details.name ?? email, passwordHash, disabledAt: null },
        { transaction },
      )
      const workroom = await Workroom.create(
        {
          id: newId(),
          name: details.workroomName ?? email,
          note: '',
          unit,
          currency: 'USD',
          timeZone,
          allowances: usualAllowances,
        },
        { transaction },
      )
      const membership = await Membership.create(
        { id: newId(), workroomId: workroom.id, userId: user.id, disabledAt: null },
        { transaction },
      )
      await MembershipRole.create(
        { membershipId: membership.id, role: 'owner', workroomId: workroom.id },
        { transaction },
      )
      return { email }
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new AccessError('conflict', 'Somebody with this address has joined meanwhile. Sign in instead.')
  }
}

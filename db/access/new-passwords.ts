import 'server-only'
import type * as z from 'zod'
import { invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { User } from '../models/user'
import { hashPassword, passwordMatches } from '../passwords'
import { secretToken } from '../secret-tokens'
import { changePasswordShape, forgottenShape, resetShape } from '../shapes/account'
import { inTransaction } from '../transactions'
import { giveBack, takeTry } from './limits'
import { enqueue } from './outbox'
import { type SignedIn, endAllSessions, replaceSessions } from './sessions'
import { issueToken, liveToken, spendToken } from './tokens'

/**
 * Asks for a mail to choose a new password by. The answer, and the work done before it, are the same whether or not the
 * address is known.
 * @throws AccessError invalid, limited
 */
export async function requestReset(input: z.input<typeof forgottenShape>, address: string): Promise<void> {
  const { email } = checkInput(forgottenShape, input)
  await takeTry('mail address', address)
  await takeTry('mail account', email)
  await enqueue('mail-reset', { email })
}

/** For the mail: who asked and the link, or null when nobody with this address may sign in. */
export async function resetLink(
  jobId: string,
  email: string,
): Promise<{ readonly name: string; readonly token: string } | null> {
  const user = await User.findOne({ where: { email, disabledAt: null } })
  if (!user) return null
  await issueToken('reset', jobId, { email, userId: user.id })
  return { name: user.name, token: secretToken('reset', jobId) }
}

/** Whose password the link of a mail would change, or null when it was used or has expired. */
export async function openReset(token: string): Promise<{ readonly email: string } | null> {
  const found = await liveToken('reset', token)
  return found && { email: found.email }
}

/**
 * Sets a new password by the link of a mail and ends every session of the person. Whoever holds the link has the mailbox,
 * so wrong tries before it no longer close the account.
 * @throws AccessError invalid
 */
export async function resetPassword(input: z.input<typeof resetShape>): Promise<{ email: string }> {
  const { token, password } = checkInput(resetShape, input)
  const passwordHash = await hashPassword(password)
  const { email } = await inTransaction(async (transaction) => {
    const { userId, email } = await spendToken('reset', token, transaction)
    const user = await User.findOne({ where: { id: userId ?? '' }, transaction })
    if (!user) throw notFound('account')
    await user.update({ passwordHash }, { transaction })
    await endAllSessions(user.id, transaction)
    await enqueue('mail-password-changed', { email, name: user.name }, { transaction })
    return { email }
  })
  await giveBack('sign-in account', email, true)
  return { email }
}

/**
 * Changes the password of whoever is signed in and ends every session. A new one for this device comes into being with
 * the change, so that there is no moment at which the password is changed and the person shut out.
 * @returns id of the new session
 * @throws AccessError invalid, limited
 */
export async function changePassword(
  signedIn: SignedIn,
  input: z.input<typeof changePasswordShape>,
): Promise<{ sessionId: string }> {
  const { current, next } = checkInput(changePasswordShape, input)
  const { email, userId, userName } = signedIn
  await takeTry('sign-in account', email)
  const user = await User.findByPk(userId, { rejectOnEmpty: true })
  if (!(await passwordMatches(user.passwordHash, current)))
    throw invalid('current', 'This is not your present password.')
  await giveBack('sign-in account', email, true)
  const passwordHash = await hashPassword(next)
  return inTransaction(async (transaction) => {
    await User.update({ passwordHash }, { where: { id: userId }, transaction })
    const sessionId = await replaceSessions(signedIn, transaction)
    await enqueue('mail-password-changed', { email, name: userName }, { transaction })
    return { sessionId }
  })
}

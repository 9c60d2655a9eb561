import 'server-only'
import * as z from 'zod'
import { AccessError } from '../access-error'
import { User } from '../models/user'
import { passwordMatches } from '../passwords'
import { emailShape } from '../shapes/email'
import { giveBack, takeTry } from './limits'
import { startSession } from './sessions'

const signInShape = z.strictObject({ email: emailShape, password: z.string().min(1).max(200) })

/**
 * Checks an e-mail address and a password and starts a session.
 * The same answer, after about the same time, for an unknown address, a wrong password and a disabled person.
 * @param address where the request came from, for the limits
 * @param device in words, for the person's list of sessions
 * @throws AccessError not-signed-in, limited, unavailable
 */
export async function signIn(
  input: { readonly email: string; readonly password: string },
  address: string,
  device = '',
): Promise<{ userId: string; sessionId: string }> {
  const refused = new AccessError('not-signed-in', 'The e-mail address or the password is not right.')
  const checked = signInShape.safeParse(input)
  if (!checked.success) throw refused
  const { email, password } = checked.data
  await takeTry('sign-in address', address)
  await takeTry('sign-in account', email)
  const user = await User.findOne({ where: { email } })
  const matches = await passwordMatches(user?.passwordHash ?? null, password)
  if (!user || !matches || user.disabledAt) throw refused
  await giveBack('sign-in account', email, true)
  await giveBack('sign-in address', address, false)
  return { userId: user.id, sessionId: await startSession(user.id, device) }
}

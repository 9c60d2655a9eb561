import 'server-only'
import { Op, type Transaction } from 'sequelize'
import { invalid } from '../access-error'
import { Token, type TokenDetails, type TokenKind } from '../models/token'
import { secretToken, tokenHash } from '../secret-tokens'

const hour = 3_600_000
const lifetimes: Readonly<Record<TokenKind, number>> = {
  join: 24 * hour,
  reset: hour,
  invitation: 7 * 24 * hour,
}

/** Writes the row of a link. Under an id that is there already nothing changes. */
export async function issueToken(
  kind: TokenKind,
  id: string,
  about: {
    readonly email: string
    readonly userId?: string
    readonly workroomId?: string
    readonly details?: TokenDetails
  },
  transaction?: Transaction,
): Promise<Token> {
  const now = new Date()
  const [token] = await Token.findOrCreate({
    where: { id, kind },
    defaults: {
      id,
      kind,
      tokenHash: tokenHash(secretToken(kind, id)),
      email: about.email,
      userId: about.userId ?? null,
      workroomId: about.workroomId ?? null,
      details: about.details ?? {},
      createdAt: now,
      expiresAt: new Date(now.getTime() + lifetimes[kind]),
      usedAt: null,
    },
    transaction,
  })
  return token
}

/** The row of a link that still works, or null. */
export async function liveToken(
  kind: TokenKind,
  token: string,
  transaction?: Transaction,
): Promise<Token | null> {
  if (!/^[\w-]{43}$/.test(token)) return null
  return Token.findOne({
    where: { kind, tokenHash: tokenHash(token), usedAt: null, expiresAt: { [Op.gt]: new Date() } },
    transaction,
  })
}

/**
 * Uses a link up: of two at once only one gets through.
 * @throws AccessError invalid when it was used before or has expired
 */
export async function spendToken(kind: TokenKind, token: string, transaction: Transaction): Promise<Token> {
  const spent = invalid('token', 'This link was used already or has expired. Ask for a new one.')
  const found = await liveToken(kind, token, transaction)
  if (!found) throw spent
  const [used] = await Token.update(
    { usedAt: new Date() },
    { where: { id: found.id, usedAt: null }, transaction },
  )
  if (used !== 1) throw spent
  return found
}

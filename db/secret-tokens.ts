import 'server-only'
import { createHash, createHmac } from 'node:crypto'

/**
 * The secret part of a link: 256 bits, made from the id of its row and the server's secret, so that a repeated mail or a
 * repeated request gives the same link while the database holds nothing but a hash.
 * @throws Error when NEXTAUTH_SECRET is not set
 */
export function secretToken(purpose: 'share' | 'join' | 'reset' | 'invitation', id: string): string {
  const secret = process.env.NEXTAUTH_SECRET
  if (!secret) throw new Error('NEXTAUTH_SECRET is not set: see .env.example.')
  return createHmac('sha256', secret).update(`${purpose}:${id}`).digest('base64url')
}

/** What is kept of a token. @returns 64 hex digits */
export function tokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex')
}

import 'server-only'
import { hash, verify } from '@node-rs/argon2'

/** Argon2id, 19 MiB, two passes: about a tenth of a second. */
const cost = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/** @returns the encoded hash, salt and cost included */
export function hashPassword(password: string): Promise<string> {
  return hash(password, cost)
}

let decoy: Promise<string> | undefined

/** Whether the password is right. Without a hash the same work is done and the answer is no: nobody learns who exists. */
export async function passwordMatches(encoded: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password')
  const matches = await verify(encoded ?? (await decoy), password)
  return matches && encoded !== null
}

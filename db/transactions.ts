import 'server-only'
import { setTimeout as pause } from 'node:timers/promises'
import { DatabaseError, type Transaction } from 'sequelize'
import { connection } from './connection'

/** Lock wait timed out, deadlock, record changed since it was read: the whole transaction may simply be tried again. */
const passing = new Set([1205, 1213, 1020])
const tries = 5

function mayPass(error: unknown): boolean {
  if (!(error instanceof DatabaseError)) return false
  const { errno } = error.original as { errno?: number }
  return errno !== undefined && passing.has(errno)
}

/**
 * Runs `work` in a managed transaction and again, whole, when the database lost a race (five tries with jitter).
 * `work` must have no effect outside the database: mail and the like go through the jobs table.
 */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await connection.transaction(work)
    } catch (error) {
      if (attempt === tries || !mayPass(error)) throw error
      await pause(Math.random() * 20 * 2 ** attempt)
    }
  }
}

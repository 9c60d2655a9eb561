import 'server-only'
import { QueryTypes } from 'sequelize'
import { connection } from '../connection'

/** Whether the database answers at the moment. */
export async function databaseAnswers(): Promise<boolean> {
  try {
    await connection.query('SELECT 1', { type: QueryTypes.SELECT })
    return true
  } catch {
    return false
  }
}

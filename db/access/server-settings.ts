import 'server-only'
import { QueryTypes } from 'sequelize'
import { connection } from '../connection'

interface Settings {
  readonly engine: string
  readonly flush: number
  readonly mode: string
  readonly charset: string
  readonly zone: string
}

/** What is wrong with the database server, in words for whoever runs it; nothing when saves are safe there. */
export async function serverProblems(): Promise<string[]> {
  const [settings] = await connection.query<Settings>(
    `SELECT @@default_storage_engine AS engine, @@innodb_flush_log_at_trx_commit AS flush, @@sql_mode AS mode,
       @@character_set_connection AS charset, @@time_zone AS zone`,
    { type: QueryTypes.SELECT },
  )
  const tables = await connection.query<{ name: string; engine: string; keyed: number }>(
    `SELECT t.TABLE_NAME AS name, t.ENGINE AS engine,
       (SELECT COUNT(*) FROM information_schema.TABLE_CONSTRAINTS c WHERE c.TABLE_SCHEMA = t.TABLE_SCHEMA
         AND c.TABLE_NAME = t.TABLE_NAME AND c.CONSTRAINT_TYPE = 'PRIMARY KEY') AS keyed
     FROM information_schema.TABLES t WHERE t.TABLE_SCHEMA = DATABASE() AND t.TABLE_TYPE = 'BASE TABLE'`,
    { type: QueryTypes.SELECT },
  )
  const wrong = (holds: boolean | undefined, words: string) => (holds ? [] : [words])
  return [
    ...wrong(settings?.engine === 'InnoDB', 'default_storage_engine must be InnoDB'),
    ...wrong(
      settings?.flush === 1,
      'innodb_flush_log_at_trx_commit must be 1, or saves get lost in a power cut',
    ),
    ...wrong(settings?.mode.includes('STRICT_'), 'sql_mode must be strict'),
    ...wrong(settings?.charset === 'utf8mb4', 'the connection must use utf8mb4'),
    ...wrong(settings?.zone === '+00:00', 'the connection must use UTC'),
    ...tables.flatMap(({ name, engine, keyed }) => [
      ...wrong(engine === 'InnoDB', `table ${name} must use InnoDB`),
      ...wrong(keyed === 1, `table ${name} must have a primary key`),
    ]),
  ]
}

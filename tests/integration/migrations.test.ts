import { execFile } from 'node:child_process'
import { promisify } from 'node:util'
import mariadb from 'mariadb'
import { QueryTypes, Sequelize } from 'sequelize'
import { expect, it } from 'vitest'
import { migrate, withMigrator } from '../../scripts/migrate.mjs'

const name = 'chalkfold_test_migrations'

function databaseNamed(database: string): string {
  const url = new URL(process.env.DATABASE_URL ?? '')
  url.pathname = `/${database}`
  return url.href
}

async function on<T>(url: string, work: (database: Sequelize) => Promise<T>): Promise<T> {
  const database = new Sequelize(url, { dialect: 'mariadb', dialectModule: mariadb, logging: false })
  try {
    return await work(database)
  } finally {
    await database.close()
  }
}

/** Every column, index and foreign key of the database. */
async function schemaOf(url: string) {
  return on(url, async (database) => {
    const ask = (sql: string) => database.query(sql, { type: QueryTypes.SELECT })
    return Promise.all([
      ask(`SELECT TABLE_NAME, COLUMN_NAME, COLUMN_TYPE, IS_NULLABLE, COLLATION_NAME, COLUMN_DEFAULT
           FROM information_schema.COLUMNS WHERE TABLE_SCHEMA = DATABASE() ORDER BY 1, 2`),
      ask(`SELECT TABLE_NAME, INDEX_NAME, SEQ_IN_INDEX, COLUMN_NAME, NON_UNIQUE
           FROM information_schema.STATISTICS WHERE TABLE_SCHEMA = DATABASE() ORDER BY 1, 2, 3`),
      ask(`SELECT TABLE_NAME, CONSTRAINT_NAME, REFERENCED_TABLE_NAME, DELETE_RULE
           FROM information_schema.REFERENTIAL_CONSTRAINTS WHERE CONSTRAINT_SCHEMA = DATABASE() ORDER BY 1, 2`),
    ])
  })
}

/** The migrator's own list stays. */
const notOwnTable = (column: object) => !('TABLE_NAME' in column && column.TABLE_NAME === 'migrations')

const count = (url: string, table: string) =>
  on(url, (database) => database.getQueryInterface().select(null, table, {})).then((rows) => rows.length)

it('go up, down and up again on a database that is in use', async () => {
  await on(process.env.DATABASE_URL ?? '', async (database) => {
    await database.getQueryInterface().dropDatabase(name)
    await database.getQueryInterface().createDatabase(name)
  })
  const url = databaseNamed(name)
  await migrate(url)
  const first = await schemaOf(url)
  const seed = ['--import', 'tsx', '--conditions=react-server', 'db/seeds/demo.ts']
  const env = { ...process.env, DATABASE_URL: url, DEMO_PASSWORD: 'plum tree by the river' }
  await promisify(execFile)(process.execPath, seed, { env })
  expect(await count(url, 'clients')).toBe(5)

  await withMigrator(url, (migrator) => migrator.down({ to: 0 }))
  expect((await schemaOf(url))[0].filter(notOwnTable)).toEqual([])
  await migrate(url)
  expect(await schemaOf(url)).toEqual(first)

  await promisify(execFile)(process.execPath, seed, { env })
  expect(await count(url, 'clients')).toBe(5)
})

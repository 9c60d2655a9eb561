import { afterEach, expect, it } from 'vitest'
import { serverProblems } from '@/db/access/server-settings'
import { connection } from '@/db/connection'

const tables = connection.getQueryInterface()
afterEach(() => tables.dropTable('keyless'))

it('finds nothing wrong with the database that the scripts start', async () => {
  expect(await serverProblems()).toEqual([])
})

it('names a table without a primary key, and one that a power cut could break', async () => {
  await tables.createTable('keyless', { word: 'VARCHAR(10)' }, { engine: 'Aria' })
  expect(await serverProblems()).toEqual([
    'table keyless must use InnoDB',
    'table keyless must have a primary key',
  ])
})

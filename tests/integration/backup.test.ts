import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { QueryTypes, Sequelize } from 'sequelize'
import mariadb from 'mariadb'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { backUp } from '../../scripts/keeping/back-up.mjs'
import { restore } from '../../scripts/keeping/restore.mjs'

const folder = mkdtempSync(join(tmpdir(), 'chalkfold-backup-test-'))
const files = join(folder, 'files')
const archive = join(folder, 'saved', 'backup.tar.gz')
const source = databaseNamed('chalkfold_test_saved')
const target = databaseNamed('chalkfold_test_restored')
const awkward = "O'Neil — ½ ″ ₦ 🧵\nsecond line\t\\ ; (1,2),"

function databaseNamed(name: string): string {
  const url = new URL(process.env.DATABASE_URL ?? '')
  url.pathname = `/${name}`
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

async function remake(name: string): Promise<void> {
  await on(process.env.DATABASE_URL ?? '', async (database) => {
    await database.getQueryInterface().dropDatabase(name)
    await database.getQueryInterface().createDatabase(name)
  })
}

beforeAll(async () => {
  await remake('chalkfold_test_saved')
  await on(source, async (database) => {
    await database.query(
      `CREATE TABLE cards (id CHAR(36) PRIMARY KEY, note TEXT, bust DECIMAL(9,3), whole LONGBLOB, taken DATETIME(3))`,
    )
    await database.query(`CREATE TABLE empty_one (id INT PRIMARY KEY)`)
    const blob = Buffer.from(Array.from({ length: 256 }, (_, byte) => byte))
    for (let n = 0; n < 500; n++) {
      await database.query(`INSERT INTO cards VALUES (?, ?, ?, ?, ?)`, {
        replacements: [`card-${n}`, `${awkward} ${n}`, `927.${n}`, blob, '2026-03-29 01:30:00.123'],
        type: QueryTypes.INSERT,
      })
    }
  })
  mkdirSync(join(files, 'a'), { recursive: true })
  writeFileSync(join(files, 'a', 'photo.jpg'), 'not really a picture')
  expect(await backUp({ url: source, files, archive })).toEqual({ tables: 2, files: 1 })
})

afterAll(() => rmSync(folder, { recursive: true, force: true }))

test('a backup restores into an empty database with every row and file the same', async () => {
  await remake('chalkfold_test_restored')
  const place = join(folder, 'restored-files')
  expect(await restore({ url: target, files: place, archive })).toMatchObject({ tables: 2, files: 1 })
  const rows = (url: string) =>
    on(url, (database) => database.query('SELECT * FROM cards ORDER BY id', { type: QueryTypes.SELECT }))
  expect(await rows(target)).toEqual(await rows(source))
  expect(await rows(target)).toHaveLength(500)
  expect(readFileSync(join(place, 'a', 'photo.jpg'), 'utf8')).toBe('not really a picture')
})

test('only its owner can read a backup', () => {
  expect(statSync(archive).mode & 0o077).toBe(0)
})

test('a restore refuses to overwrite a database that holds anything', async () => {
  await expect(restore({ url: source, files: join(folder, 'elsewhere'), archive })).rejects.toThrow(
    'The database is not empty (2 tables)',
  )
})

test('a damaged backup is refused before anything is changed', async () => {
  await remake('chalkfold_test_restored')
  const bytes = readFileSync(archive)
  bytes[Math.floor(bytes.length / 2)]! ^= 0xff
  const damaged = join(folder, 'damaged.tar.gz')
  writeFileSync(damaged, bytes)
  await expect(restore({ url: target, files: join(folder, 'unused'), archive: damaged })).rejects.toThrow(
    'is damaged',
  )
  const tables = await on(target, (database) => database.query('SHOW TABLES', { type: QueryTypes.SELECT }))
  expect(tables).toEqual([])
})

import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { databaseUrl, openDatabase } from '../../db/local/database.mjs'
import { startServer } from '../../db/local/server.mjs'
import { migrate } from '../../scripts/migrate.mjs'

/** A server of this test's own: killing it must not disturb the others. */
const folder = mkdtempSync(join(tmpdir(), 'chalkfold-durability-'))
const database = { name: 'chalkfold_test_killed', password: 'only-for-this-test' }
type Server = Awaited<ReturnType<typeof startServer>>
let server: Server

beforeAll(async () => {
  server = await startServer({ folder, remembered: {} })
  // Set before anything loads the connection, which is made from it: hence no module of db at the top of this file.
  process.env.DATABASE_URL = databaseUrl({ ...database, port: server.port })
  await openDatabase(server, database)
  await migrate(process.env.DATABASE_URL)
})

afterAll(async () => {
  const { connection } = await import('@/db/connection')
  await connection.close()
  await server.stop()
  rmSync(folder, { recursive: true, force: true })
})

test('of a thousand versions that were answered as saved none is lost when the database is killed', async () => {
  const { makeWorkroom } = await import('../support/workroom')
  const { nextRevision, startDraft } = await import('../support/draft-inputs')
  const { listRevisions, saveRevision } = await import('@/db/access/revisions')
  const { actor } = await (await makeWorkroom()).person('owner')
  const drafts = await Promise.all(Array.from({ length: 8 }, () => startDraft(actor)))
  const acknowledged = new Map<string, string[]>()
  let count = 0

  // Eight drafters save without a pause until the database is gone under them.
  const drafters = drafts.map(async ({ id, head }) => {
    const saved: string[] = []
    acknowledged.set(id, saved)
    let base = head.id
    for (;;) {
      const revision = nextRevision(id, base, 900 + saved.length)
      try {
        await saveRevision(actor, revision)
      } catch {
        return
      }
      saved.push((base = revision.id))
      if (++count === 1000)
        process.kill(Number(readFileSync(join(server.socketFolder, 'm.pid'), 'utf8')), 'SIGKILL')
    }
  })
  await Promise.all(drafters)
  expect(count).toBeGreaterThanOrEqual(1000)

  server = await startServer({ folder, remembered: { port: server.port, socketFolder: server.socketFolder } })
  for (const [draftId, ids] of acknowledged) {
    const kept = new Set((await listRevisions(actor, draftId)).map(({ id }) => id))
    expect(ids.filter((id) => !kept.has(id))).toEqual([])
  }
}, 120_000)

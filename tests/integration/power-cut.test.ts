import { spawn } from 'node:child_process'
import { createInterface } from 'node:readline'
import mariadb from 'mariadb'
import { Sequelize } from 'sequelize'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { migrate } from '../../scripts/migrate.mjs'
import { type OwnMariadb, makeMariadb } from '../support/own-mariadb'

let server: OwnMariadb
beforeAll(async () => {
  server = await makeMariadb()
  await migrate(server.url)
}, 60_000)
afterAll(() => server.remove())

/** Saves until the server is killed after so many acknowledged saves. @returns their ids, and how the next was refused */
async function savesUntilPowerCut(count: number): Promise<{ saved: string[]; refused: string }> {
  const saver = spawn(
    process.execPath,
    ['--import', 'tsx', '--conditions=react-server', 'tests/support/saver.ts'],
    {
      env: { ...process.env, DATABASE_URL: server.url },
      stdio: ['ignore', 'pipe', 'inherit'],
    },
  )
  const saved: string[] = []
  let refused = ''
  for await (const line of createInterface({ input: saver.stdout })) {
    const [word, rest = ''] = line.split(' ')
    if (word === 'saved' && saved.push(rest) === count) void server.kill()
    if (word === 'refused') refused = rest
  }
  return { saved, refused }
}

it('loses none of a thousand acknowledged saves when the database is killed, and says 503 meanwhile', async () => {
  const { saved, refused } = await savesUntilPowerCut(1000)
  expect(saved.length).toBeGreaterThanOrEqual(1000)
  expect(refused).toBe('503')
  await server.start()
  const database = new Sequelize(server.url, { dialect: 'mariadb', dialectModule: mariadb, logging: false })
  const rows = (await database.getQueryInterface().select(null, 'revisions', {})) as unknown as {
    id: string
  }[]
  const drafts = (await database.getQueryInterface().select(null, 'drafts', {})) as unknown as {
    headId: string
  }[]
  await database.close()
  const kept = new Set(rows.map(({ id }) => id))
  expect(saved.filter((id) => !kept.has(id))).toEqual([])
  expect(drafts.filter(({ headId }) => !kept.has(headId))).toEqual([])
}, 180_000)

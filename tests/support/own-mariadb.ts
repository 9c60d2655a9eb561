import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as pause } from 'node:timers/promises'
import { openDatabase } from '../../db/local/database.mjs'
import { startServer } from '../../db/local/server.mjs'
import { isAlive } from '../../scripts/local/processes.mjs'

/** A database server of a test's own, which may be killed. */
export interface OwnMariadb {
  readonly url: string
  readonly start: () => Promise<void>
  /** As a power cut would: nothing is written any more. */
  readonly kill: () => Promise<void>
  readonly remove: () => Promise<void>
}

export async function makeMariadb(): Promise<OwnMariadb> {
  const folder = mkdtempSync(join(tmpdir(), 'chalkfold-db-'))
  let server = await startServer({ folder, remembered: {} })
  const { port, socketFolder } = server
  const url = await openDatabase(server, { name: 'chalkfold_test_killed', password: 'local-only' })

  async function kill(): Promise<void> {
    if (isAlive(server.pid)) process.kill(server.pid, 'SIGKILL')
    while (isAlive(server.pid)) await pause(20)
  }

  return {
    url,
    start: async () => {
      server = await startServer({ folder, remembered: { port, socketFolder } })
    },
    kill,
    remove: async () => {
      await kill()
      rmSync(folder, { recursive: true, force: true })
    },
  }
}

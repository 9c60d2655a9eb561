import { join } from 'node:path'
import { ensureCommands } from '../local/debian.mjs'
import { readEnvFile } from '../local/env-file.mjs'
import { dataFolder, root } from '../local/paths.mjs'
import { localDatabase } from '../local/services.mjs'
import { openSettings } from '../local/settings.mjs'
import { createStopping } from '../local/stopping.mjs'

/** Where uploaded files stand. */
export const filesFolder = join(dataFolder, 'files')

/** Where backups go when no other place is given. */
export const backupFolder = join(dataFolder, 'backups')

/**
 * Works on the database of DATABASE_URL, or on the local one, which is started for as long as it takes unless it runs.
 * @template T
 * @param {(database: { url: string, local: boolean }) => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withDatabase(work) {
  readEnvFile(join(root, '.env'))
  await ensureCommands(['mariadb-dump'])
  if (process.env.DATABASE_URL) return work({ url: process.env.DATABASE_URL, local: false })
  await ensureCommands(['mariadbd'])
  const stopping = createStopping()
  const installation = openSettings(dataFolder)
  try {
    const database = { name: 'chalkfold' }
    const url = await localDatabase({
      folder: dataFolder,
      installation,
      stopping,
      database,
      leaveRunning: true,
    })
    return await work({ url, local: true })
  } finally {
    await stopping.stop()
  }
}

import { cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { isDeepStrictEqual } from 'node:util'
import { readJson } from '../local/json-file.mjs'
import { SetUpError } from '../local/say.mjs'
import { fileChecksum, fileChecksums, inside, unpack } from './archive.mjs'
import { dump, load, tableChecksums, tableNames } from './dump.mjs'

/**
 * Puts a backup into an empty database and an empty files folder, then reads both back and compares every checksum.
 * @param {{ url: string, files: string, archive: string }} options
 * @returns {Promise<{ tables: number, files: number, madeAt: string }>}
 * @throws {SetUpError} before anything is changed when the archive is damaged or the place is not empty
 */
export async function restore({ url, files, archive }) {
  const folder = mkdtempSync(join(tmpdir(), 'chalkfold-restore-'))
  try {
    const manifest = await openArchive(archive, folder)
    await refuseFull(url, files)

    await load(url, join(folder, inside.database))
    mkdirSync(files, { recursive: true, mode: 0o700 })
    if (existsSync(join(folder, inside.files))) cpSync(join(folder, inside.files), files, { recursive: true })

    const again = join(folder, 'again.sql')
    await dump(url, again)
    compare('table', manifest.tables, await tableChecksums(again))
    compare('file', manifest.files, await fileChecksums(files))
    return {
      tables: Object.keys(manifest.tables).length,
      files: Object.keys(manifest.files).length,
      madeAt: manifest.madeAt,
    }
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

async function openArchive(archive, folder) {
  if (!existsSync(archive)) throw new SetUpError(`There is no backup at ${archive}.`)
  const damaged = (what) =>
    new SetUpError(`${archive} is damaged (${what}); nothing was changed. Use another backup.`)
  try {
    await unpack(archive, folder)
  } catch (error) {
    throw damaged(error.message.split('\n').at(-1))
  }
  const manifest = readJson(join(folder, inside.manifest))
  const sql = join(folder, inside.database)
  if (!manifest || !existsSync(sql)) throw damaged('its list of contents or its database is missing')
  if ((await fileChecksum(sql)) !== manifest.database)
    throw damaged('the database does not match its checksum')
  if (!isDeepStrictEqual(await fileChecksums(join(folder, inside.files)), manifest.files)) {
    throw damaged('a file does not match its checksum')
  }
  return manifest
}

async function refuseFull(url, files) {
  const tables = await tableNames(url)
  if (tables.length > 0) {
    throw new SetUpError(
      `The database is not empty (${tables.length} tables), and a restore never overwrites work. Set DATABASE_URL to an empty database, or set the local one aside first: stop Chalkfold and move its data folder away.`,
    )
  }
  if (existsSync(files) && readdirSync(files).length > 0) {
    throw new SetUpError(`${files} is not empty, and a restore never overwrites work. Move it away first.`)
  }
}

function compare(kind, wanted, found) {
  const wrong = Object.keys({ ...wanted, ...found }).filter((name) => wanted[name] !== found[name])
  if (wrong.length > 0)
    throw new SetUpError(`Restored, but not the same as the backup: ${kind} ${wrong.join(', ')}.`)
}

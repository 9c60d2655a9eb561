import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { root } from '../local/paths.mjs'
import { fileChecksum, fileChecksums, inside, pack } from './archive.mjs'
import { dump, tableChecksums } from './dump.mjs'

/**
 * Saves a database and the files beside it into one archive with a checksum of every table and file.
 * @param {{ url: string, files: string, archive: string }} options
 * @returns {Promise<{ tables: number, files: number }>} how much is in it
 */
export async function backUp({ url, files, archive }) {
  const folder = mkdtempSync(join(tmpdir(), 'chalkfold-backup-'))
  try {
    const sql = join(folder, inside.database)
    await dump(url, sql)
    // Copied first: a file that changes while it is read would not match its own checksum.
    if (existsSync(files)) cpSync(files, join(folder, inside.files), { recursive: true })
    const manifest = {
      madeAt: new Date().toISOString(),
      version: JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).version,
      database: await fileChecksum(sql),
      tables: await tableChecksums(sql),
      files: await fileChecksums(join(folder, inside.files)),
    }
    writeFileSync(join(folder, inside.manifest), JSON.stringify(manifest, null, 2), { mode: 0o600 })
    await pack(folder, archive)
    return { tables: Object.keys(manifest.tables).length, files: Object.keys(manifest.files).length }
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

/**
 * Name of a backup by its moment, so that names in order are backups in order.
 * @param {Date} moment
 */
export function archiveName(moment) {
  return `chalkfold-${moment.toISOString().slice(0, 19).replaceAll(':', '')}Z.tar.gz`
}

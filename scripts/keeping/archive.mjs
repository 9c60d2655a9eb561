import { createHash } from 'node:crypto'
import { createReadStream, existsSync, mkdirSync, readdirSync, renameSync, rmSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { pipeline } from 'node:stream/promises'
import { run } from '../local/processes.mjs'

/** Names inside an archive. */
export const inside = { manifest: 'manifest.json', database: 'database.sql', files: 'files' }

/**
 * Packs a folder into one .tar.gz that only this account can read, whole or not at all.
 * @param {string} folder
 * @param {string} archive path to write
 */
export async function pack(folder, archive) {
  mkdirSync(dirname(archive), { recursive: true, mode: 0o700 })
  const half = `${archive}.unfinished`
  try {
    await run('sh', ['-c', 'umask 077 && exec tar -czf "$1" -C "$2" .', 'sh', half, folder], { quiet: true })
    renameSync(half, archive)
  } finally {
    rmSync(half, { force: true })
  }
}

/** Unpacks an archive into an empty folder. */
export async function unpack(archive, folder) {
  await run('tar', ['-xzf', archive, '-C', folder, '--no-same-owner'], { quiet: true })
}

/**
 * SHA-256 of every file below a folder, by its path; nothing when the folder is not there.
 * @param {string} folder
 * @returns {Promise<Record<string, string>>}
 */
export async function fileChecksums(folder) {
  const sums = {}
  if (!existsSync(folder)) return sums
  for (const entry of readdirSync(folder, { withFileTypes: true, recursive: true })) {
    if (!entry.isFile()) continue
    const path = join(entry.parentPath ?? entry.path, entry.name)
    sums[relative(folder, path)] = await fileChecksum(path)
  }
  return sums
}

/** SHA-256 of one file. */
export async function fileChecksum(path) {
  const hash = createHash('sha256')
  await pipeline(createReadStream(path), hash)
  return hash.digest('hex')
}

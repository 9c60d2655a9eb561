import { existsSync, lstatSync, mkdirSync, mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** The system cuts socket paths at 107 bytes. */
const longestSocketPath = 107

/**
 * A folder for the server's socket and process id: beside the data when the path is short enough, otherwise a private
 * one in the temporary folder, remembered between starts.
 * @param {string} folder of the database
 * @param {string | undefined} remembered the temporary folder of an earlier start
 * @returns {string}
 */
export function socketFolder(folder, remembered) {
  const beside = join(folder, 'run')
  if (Buffer.byteLength(join(beside, 'm.sock')) < longestSocketPath) {
    mkdirSync(beside, { recursive: true, mode: 0o700 })
    return beside
  }
  if (remembered && isOurs(remembered)) return remembered
  return mkdtempSync(join(Buffer.byteLength(tmpdir()) < 60 ? tmpdir() : '/tmp', 'chalkfold-'))
}

/** A temporary folder may have been cleared, and made again by somebody else. */
function isOurs(path) {
  return existsSync(path) && lstatSync(path).isDirectory() && lstatSync(path).uid === process.getuid?.()
}

import { createHash, randomUUID } from 'node:crypto'
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/**
 * @typedef {object} Kept
 * @property {string} key
 * @property {number} size in bytes
 * @property {string} etag MD5 of the bytes in hex
 * @property {string} modified ISO 8601
 * @property {Record<string, string>} headers sent with the object whenever it is read
 */

/**
 * Objects in a folder, one file each: a line of JSON that describes it, then its bytes. A file is named by the hash of
 * its key, so that no key, whatever stands in it, leads out of the folder; it is written whole or not at all.
 * @param {string} folder
 */
export function openStore(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const pathOf = (key) => join(folder, `${createHash('sha256').update(key).digest('hex')}.object`)

  /** @returns {{ kept: Kept, bytes: Buffer } | undefined} */
  function read(path) {
    if (!existsSync(path)) return undefined
    const file = readFileSync(path)
    const end = file.indexOf('\n')
    return { kept: JSON.parse(file.toString('utf8', 0, end)), bytes: file.subarray(end + 1) }
  }

  return {
    /** @param {string} key */
    read: (key) => read(pathOf(key)),

    /**
     * Keeps an object in the place of what was there.
     * @param {string} key
     * @param {Buffer} bytes
     * @param {Record<string, string>} headers
     * @returns {Kept}
     */
    write(key, bytes, headers) {
      const etag = createHash('md5').update(bytes).digest('hex')
      const kept = { key, size: bytes.length, etag, modified: new Date().toISOString(), headers }
      const path = pathOf(key)
      const half = `${path}.${randomUUID()}.new`
      writeFileSync(half, Buffer.concat([Buffer.from(`${JSON.stringify(kept)}\n`), bytes]), { mode: 0o600 })
      renameSync(half, path)
      return kept
    },

    /** @param {string} key */
    remove: (key) => rmSync(pathOf(key), { force: true }),

    /** @returns {Kept[]} by key, in the order of their bytes */
    list() {
      return readdirSync(folder)
        .filter((name) => name.endsWith('.object'))
        .map((name) => read(join(folder, name)).kept)
        .sort((one, other) => Buffer.compare(Buffer.from(one.key), Buffer.from(other.key)))
    },
  }
}

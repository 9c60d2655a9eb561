import { spawn } from 'node:child_process'
import { createReadStream, createWriteStream } from 'node:fs'
import { once } from 'node:events'
import { createHash } from 'node:crypto'
import { createInterface } from 'node:readline'
import { pipeline } from 'node:stream/promises'
import { SetUpError } from '../local/say.mjs'
import { attempt } from '../local/processes.mjs'
import { tool, toolConnection } from './connection.mjs'

/**
 * Writes one consistent picture of a database, taken in a single transaction while people go on working.
 * @param {string} url
 * @param {string} path of the SQL file to write
 */
export async function dump(url, path) {
  const { name, args, env } = toolConnection(url)
  const options = [
    '--single-transaction',
    '--no-tablespaces',
    '--order-by-primary',
    '--hex-blob',
    '--skip-comments',
  ]
  const child = spawn(tool('mariadb-dump'), [...args, ...options, '--default-character-set=utf8mb4', name], {
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let said = ''
  child.stderr.on('data', (chunk) => (said += chunk))
  const ended = once(child, 'close')
  await pipeline(child.stdout, createWriteStream(path, { mode: 0o600 }))
  const [code] = await ended
  if (code !== 0) throw new SetUpError(`The database could not be saved: ${said.trim()}`)
}

/**
 * Runs an SQL file against a database.
 * @param {string} url
 * @param {string} path
 */
export async function load(url, path) {
  const { name, args, env } = toolConnection(url)
  const child = spawn(tool('mariadb'), [...args, '--default-character-set=utf8mb4', name], {
    env,
    stdio: ['pipe', 'ignore', 'pipe'],
  })
  let said = ''
  child.stderr.on('data', (chunk) => (said += chunk))
  const ended = once(child, 'close')
  // When the tool gives up in the middle its reason is worth more than "broken pipe".
  await pipeline(createReadStream(path), child.stdin).catch(() => {})
  const [code] = await ended
  if (code !== 0) throw new SetUpError(`The database could not be loaded: ${said.trim()}`)
}

/** Names of the tables of a database. */
export async function tableNames(url) {
  const { name, args, env } = toolConnection(url)
  const { code, stdout, stderr } = await attempt(
    tool('mariadb'),
    [...args, '--batch', '--skip-column-names', name],
    {
      env,
      input: 'SHOW TABLES;',
    },
  )
  if (code !== 0) throw new SetUpError(`The database cannot be reached: ${stderr.trim()}`)
  return stdout.split('\n').filter(Boolean)
}

/**
 * One checksum for the rows of each table in a dump. Dumps of equal data agree in it, whatever server made them.
 * @param {string} path
 * @returns {Promise<Record<string, string>>}
 */
export async function tableChecksums(path) {
  const hashes = new Map()
  let table
  for await (const line of createInterface({ input: createReadStream(path), crlfDelay: Infinity })) {
    const created = /^CREATE TABLE `([^`]+)`/.exec(line)
    if (created) hashes.set(created[1], createHash('sha256'))
    const filled = /^INSERT INTO `([^`]+)` VALUES ?(.*)$/.exec(line)
    if (filled) table = filled[1]
    // How many rows one statement takes is the tool's affair; what counts is the rows.
    const rows = filled ? filled[2] : line.startsWith('(') ? line : ''
    if (table && rows) hashes.get(table).update(rows.replace(/[,;]$/, '')).update('\n')
  }
  return Object.fromEntries([...hashes].map(([table, hash]) => [table, hash.digest('hex')]))
}

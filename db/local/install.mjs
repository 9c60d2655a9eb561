import { existsSync, mkdirSync, readdirSync, renameSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { userInfo } from 'node:os'
import { findCommand, run } from '../../scripts/local/processes.mjs'

/**
 * Makes an empty database folder, once. It is made beside its place and then renamed, so that an interrupted first
 * start leaves nothing that looks finished, and a folder with data in it is never touched.
 * @param {string} folder holds `mysql/` afterwards
 * @returns {Promise<string>} path of the data folder
 */
export async function installDatabase(folder) {
  const data = join(folder, 'mysql')
  if (existsSync(data) && readdirSync(data).length > 0) return data
  const unfinished = join(folder, 'mysql.unfinished')
  rmSync(unfinished, { recursive: true, force: true })
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const account = userInfo().username
  await run(
    findCommand('mariadb-install-db') ?? 'mariadb-install-db',
    [
      '--no-defaults',
      ...(process.getuid?.() === 0 ? [`--user=${account}`] : []),
      `--datadir=${unfinished}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${account}`,
      '--skip-test-db',
      '--skip-name-resolve',
      '--innodb-log-file-size=16M',
    ],
    { quiet: true },
  )
  renameSync(unfinished, data)
  return data
}

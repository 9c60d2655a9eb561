import { chmodSync } from 'node:fs'
import { join } from 'node:path'
import { readJson, writeJson } from './json-file.mjs'
import { newDemoPassword, newSecret } from './secrets.mjs'

/**
 * What one local installation remembers between starts: its secrets, made at the first start, and its ports.
 * @typedef {object} LocalSettings
 * @property {string} sessionSecret signs the session cookies
 * @property {string} databasePassword of the application's account
 * @property {string} demoPassword of every demo sign-in
 * @property {{ port?: number, socketFolder?: string }} database
 * @property {{ smtpPort?: number, pagePort?: number }} mail
 */

/**
 * Reads `settings.json` of a data folder, making it with fresh secrets when it is not there.
 * @param {string} folder
 * @returns {{ settings: LocalSettings, remember: (changes: Partial<LocalSettings>) => void }}
 */
export function openSettings(folder) {
  const path = join(folder, 'settings.json')
  const settings = {
    sessionSecret: newSecret(),
    databasePassword: newSecret(),
    demoPassword: newDemoPassword(),
    database: {},
    mail: {},
    ...readJson(path),
  }
  function remember(changes) {
    Object.assign(settings, changes)
    writeJson(path, settings)
  }
  remember({})
  chmodSync(path, 0o600)
  return { settings, remember }
}

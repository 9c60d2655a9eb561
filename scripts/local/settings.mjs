import { chmodSync } from 'node:fs'
import { join } from 'node:path'
import { readJson, writeJson } from './json-file.mjs'
import { localKeyPrefix, newDemoPassword, newSecret } from './secrets.mjs'

/**
 * What one local installation remembers between starts: its secrets, made at the first start, and its ports.
 * @typedef {object} LocalSettings
 * @property {string} sessionSecret signs the session cookies
 * @property {string} databasePassword of the application's account
 * @property {string} demoPassword of every demo sign-in
 * @property {{ port?: number, socketFolder?: string }} database
 * @property {{ smtpPort?: number, pagePort?: number }} mail
 * @property {string} filesSecret signs requests to the local store of files
 * @property {{ port?: number }} files
 * @property {string} paymentsKey of the local payment service
 * @property {string} webhookSecret signs what the local payment service tells
 * @property {{ port?: number }} payments
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
    filesSecret: newSecret(),
    files: {},
    paymentsKey: `${localKeyPrefix}${newSecret()}`,
    webhookSecret: `whsec_${newSecret()}`,
    payments: {},
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

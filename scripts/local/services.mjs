import { openDatabase } from '../../db/local/database.mjs'
import { startServer } from '../../db/local/server.mjs'
import { join } from 'node:path'
import { startMail } from './mail/start.mjs'

/**
 * A database of this installation's own, started and stopped with it.
 * @param {object} options
 * @param {string} options.folder data folder of the installation
 * @param {ReturnType<import('./settings.mjs').openSettings>} options.installation
 * @param {ReturnType<import('./stopping.mjs').createStopping>} options.stopping
 * @param {{ name: string, fresh?: boolean, family?: string }} options.database
 * @param {boolean} [options.leaveRunning] a server that ran before is not stopped with us
 * @returns {Promise<string>} DATABASE_URL
 */
export async function localDatabase({ folder, installation, stopping, database, leaveRunning = false }) {
  const { settings, remember } = installation
  const server = await startServer({ folder: join(folder, 'database'), remembered: settings.database })
  if (!(leaveRunning && server.wasRunning)) stopping.onStop(server.stop)
  remember({ database: { port: server.port, socketFolder: server.socketFolder } })
  return openDatabase(server, { ...database, password: settings.databasePassword })
}

/**
 * A mailbox of this installation's own.
 * @returns {Promise<{ SMTP_URL: string, MAIL_PAGE_URL: string }>}
 */
export async function localMail({ folder, installation: { settings, remember }, stopping }) {
  const mail = await startMail({ folder, remembered: settings.mail })
  stopping.onStop(mail.stop)
  remember({ mail: mail.ports })
  return { SMTP_URL: mail.smtpUrl, MAIL_PAGE_URL: mail.pageUrl }
}

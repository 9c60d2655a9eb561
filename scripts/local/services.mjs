import { openDatabase } from '../../db/local/database.mjs'
import { startServer } from '../../db/local/server.mjs'
import { join } from 'node:path'
import { startFiles } from './files/start.mjs'
import { startMail } from './mail/start.mjs'
import { startPayments } from './payments/start.mjs'

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

/**
 * A store for files of this installation's own.
 * @returns {Promise<Record<'FILES_ENDPOINT' | 'FILES_BUCKET' | 'FILES_REGION' | 'FILES_ACCESS_KEY' | 'FILES_SECRET_KEY', string>>}
 */
export async function localFiles({ folder, installation: { settings, remember }, stopping }) {
  const bucket = 'chalkfold'
  const keys = { accessKey: 'chalkfold-local', secretKey: settings.filesSecret, region: 'local' }
  const files = await startFiles({ folder, remembered: settings.files, keys, bucket })
  stopping.onStop(files.stop)
  remember({ files: files.ports })
  return {
    FILES_ENDPOINT: files.endpoint,
    FILES_BUCKET: bucket,
    FILES_REGION: keys.region,
    FILES_ACCESS_KEY: keys.accessKey,
    FILES_SECRET_KEY: keys.secretKey,
  }
}

/**
 * A card-payment service of this installation's own, in which no money moves.
 * @param {string} origin of the application, which is told there what was paid
 * @returns {Promise<Record<'PAYMENTS_ENDPOINT' | 'STRIPE_SECRET_KEY' | 'STRIPE_WEBHOOK_SECRET', string>>}
 */
export async function localPayments({ folder, installation: { settings, remember }, stopping, origin }) {
  const payments = await startPayments({
    folder,
    remembered: settings.payments,
    secretKey: settings.paymentsKey,
    webhookSecret: settings.webhookSecret,
    webhookUrl: `${origin}/api/webhooks/payments`,
  })
  stopping.onStop(payments.stop)
  remember({ payments: payments.ports })
  return {
    PAYMENTS_ENDPOINT: payments.endpoint,
    STRIPE_SECRET_KEY: settings.paymentsKey,
    STRIPE_WEBHOOK_SECRET: settings.webhookSecret,
  }
}

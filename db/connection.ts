import 'server-only'
import * as mariadb from 'mariadb'
import { Sequelize } from 'sequelize'

declare global {
  var chalkfoldConnection: Sequelize | undefined
}

function connect(): Sequelize {
  const sequelize = new Sequelize(process.env.DATABASE_URL ?? 'mariadb://127.0.0.1/unset', {
    dialect: 'mariadb',
    dialectModule: mariadb,
    timezone: '+00:00',
    logging: false,
    pool: { max: Number(process.env.DATABASE_POOL ?? 10), acquire: 10_000, idle: 10_000 },
    dialectOptions: {
      connectTimeout: 5000,
      supportBigNumbers: false,
      bigIntAsNumber: true,
      checkNumberRange: true,
      insertIdAsNumber: true,
    },
  })
  sequelize.addHook('beforeConnect', () => {
    if (!process.env.DATABASE_URL) throw new Error('DATABASE_URL is not set: see .env.example.')
  })
  return sequelize
}

/**
 * The one pool of this process. It hangs on globalThis because a server bundle may load this module more than once.
 * DECIMAL arrives as a string, BIGINT as a number that throws past 2^53. Nothing connects before the first query.
 */
export const connection: Sequelize = (globalThis.chalkfoldConnection ??= connect())

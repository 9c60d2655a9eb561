import { ensureCommands } from '../local/debian.mjs'
import { freePort } from '../local/ports.mjs'
import { localDatabase, localFiles, localMail, localPayments } from '../local/services.mjs'
import { openSettings } from '../local/settings.mjs'
import { migrate } from '../migrate.mjs'

/** Builds of test runs; a started workroom keeps its own. */
export const testDistDir = '.next-test'

/**
 * A migrated throw-away database, a mailbox and a free port for the application, as the environment of a test run.
 * @param {{ folder: string, stopping: ReturnType<import('../local/stopping.mjs').createStopping>, keep: boolean }} options
 *   keep: what the last run left in the database stays
 * @returns {Promise<NodeJS.ProcessEnv>}
 */
export async function bringUpDatabase({ folder, stopping, keep }) {
  await ensureCommands(['mariadbd', 'mariadb-dump', 'chromium', 'pdftoppm', 'qpdf'])
  const installation = openSettings(folder)
  const { settings } = installation
  const port = await freePort()
  const origin = `http://localhost:${port}`
  const local = { folder, installation, stopping, origin }
  const database = { name: 'chalkfold_test', fresh: !keep, family: 'chalkfold_test_' }
  const env = {
    ...testEnvironment(),
    PORT: String(port),
    APP_ORIGIN: origin,
    NEXTAUTH_URL: origin,
    NEXTAUTH_SECRET: settings.sessionSecret,
    MAIL_FROM: 'Chalkfold <post@chalkfold.example>',
    DEMO_PASSWORD: settings.demoPassword,
    NEXT_DIST_DIR: testDistDir,
    ...(await localMail(local)),
    ...(await localFiles(local)),
    ...(await localPayments(local)),
    DATABASE_URL: await localDatabase({ ...local, database }),
  }
  await migrate(env.DATABASE_URL)
  return env
}

/** What every test run sees, with a database or without. */
export function testEnvironment() {
  return { ...process.env, CHALKFOLD_ENV: 'test', TZ: 'UTC' }
}

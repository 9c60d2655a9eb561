import { openSync } from 'node:fs'
import { join } from 'node:path'
import { ensureBuild } from '../local/build.mjs'
import { seedDemo } from '../local/seed.mjs'
import { serve } from '../local/serve.mjs'
import { testDistDir } from './test-database.mjs'

/**
 * The application with the demo workroom, on the database of a test run; its own lines go to app.log in the folder.
 * @param {object} options
 * @param {string} options.folder
 * @param {NodeJS.ProcessEnv} options.env as bringUpDatabase makes it
 * @param {ReturnType<import('../local/stopping.mjs').createStopping>} options.stopping
 * @param {boolean} [options.dev] serve from the sources, without a build
 * @returns {Promise<{ name: string, email: string, roles: string[] }[]>} the demo sign-ins
 */
export async function bringUpApp({ folder, env, stopping, dev = false }) {
  const signIns = await seedDemo(env)
  if (!dev) await ensureBuild(testDistDir, env)
  const output = openSync(join(folder, 'app.log'), 'w', 0o600)
  const mode = dev ? 'dev' : 'start'
  const app = await serve({ mode, port: Number(env.PORT), host: '127.0.0.1', env, output })
  stopping.onStop(app.stop)
  return signIns
}

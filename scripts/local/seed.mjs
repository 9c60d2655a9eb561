import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './paths.mjs'
import { run } from './processes.mjs'

/**
 * Puts the demo workroom into a database that does not have it yet. The seed is TypeScript beside the models it fills;
 * the react-server condition lets modules that are marked server-only load outside the framework.
 * @param {NodeJS.ProcessEnv} env with DATABASE_URL and DEMO_PASSWORD
 * @returns {Promise<{ name: string, email: string, roles: string[] }[]>} the demo sign-ins
 */
export async function seedDemo(env) {
  const seed = join(root, 'db', 'seeds', 'demo.ts')
  if (!existsSync(seed)) return []
  const args = ['--import', 'tsx', '--conditions=react-server', seed]
  const output = await run(process.execPath, args, { quiet: true, cwd: root, env })
  return JSON.parse(output.trim().split('\n').at(-1))
}

/**
 * Where the demo sign-ins of the local database are listed; while the file is there, no demo is made.
 * @param {string} folder data folder of the installation
 */
export function demoFile(folder) {
  return join(folder, 'database', 'demo.json')
}

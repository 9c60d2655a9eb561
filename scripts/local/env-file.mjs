import { existsSync, readFileSync } from 'node:fs'
import { parseEnv } from 'node:util'

/**
 * Adds the settings of a .env file to the environment; what is set already stays.
 * @param {string} path
 * @param {NodeJS.ProcessEnv} env changed in place
 */
export function readEnvFile(path, env = process.env) {
  if (!existsSync(path)) return
  for (const [name, value] of Object.entries(parseEnv(readFileSync(path, 'utf8')))) {
    if (env[name] === undefined && value !== '') env[name] = value
  }
}

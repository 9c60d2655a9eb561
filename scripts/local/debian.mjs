import { existsSync } from 'node:fs'
import { attempt, findCommand, run } from './processes.mjs'
import { say, SetUpError } from './say.mjs'

/** Commands that running or testing needs, with the Debian package that brings each. */
const needs = {
  mariadbd: 'mariadb-server',
  'mariadb-dump': 'mariadb-client',
  chromium: 'chromium',
  pdftoppm: 'poppler-utils',
  qpdf: 'qpdf',
}

/**
 * Installs the packages of those commands that are missing.
 * @param {string[]} commands
 * @param {Record<string, string>} packageOf
 * @throws {SetUpError} naming the line to type when this account may not install, or this is not Debian
 */
export async function ensureCommands(commands, packageOf = needs) {
  const missing = commands.filter((command) => !findCommand(command))
  if (missing.length === 0) return
  const packages = [...new Set(missing.map((command) => packageOf[command]))]
  const byHand = `Missing: ${missing.join(', ')}. Install with: sudo apt-get install --no-install-recommends ${packages.join(' ')}`
  if (!existsSync('/etc/debian_version') || !findCommand('apt-get')) {
    throw new SetUpError(
      `This machine is not Debian (or a relative of it), so its packages are not installed for you.\nInstall what brings ${missing.join(', ')} (on Debian: ${packages.join(' ')}) and start again.`,
    )
  }
  const prefix = await installer()
  if (!prefix) throw new SetUpError(`${byHand}\n(This account may not install packages.)`)

  say(`Installing ${packages.join(', ')} …`)
  const [command, ...args] = [...prefix, 'apt-get']
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const install = [...args, 'install', '-y', '--no-install-recommends', ...packages]
  // Package lists may never have been read on a fresh machine, or be out of date: read them, then install.
  await run(command, [...args, 'update', '-q'], { quiet: true, env })
  await run(command, install, { quiet: true, env })
  const still = missing.filter((name) => !findCommand(name))
  if (still.length > 0)
    throw new SetUpError(`${packages.join(', ')} installed, but ${still.join(', ')} is not there.`)
}

/** How this account installs packages: directly, through sudo without a password, or not at all. */
async function installer() {
  if (process.getuid?.() === 0) return []
  if (!findCommand('sudo')) return undefined
  const { code } = await attempt('sudo', ['-n', 'true'])
  return code === 0 ? ['sudo', '-n', 'env', 'DEBIAN_FRONTEND=noninteractive'] : undefined
}

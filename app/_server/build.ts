import 'server-only'
import { existsSync, readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'

const folder = path.join(/* turbopackIgnore: true */ process.cwd(), process.env.NEXT_DIST_DIR || '.next')

function readBuildId(): string | null {
  const file = path.join(folder, 'BUILD_ID')
  return process.env.NODE_ENV === 'production' && existsSync(file) ? readFileSync(file, 'utf8').trim() : null
}

/** Name of the build that is served; null when it is served from the sources. */
export const buildId = readBuildId()

/** Addresses of the scripts, styles and fonts of this build. Their names change with their contents. */
export function builtFiles(): readonly string[] {
  const top = path.join(folder, 'static')
  return readdirSync(top, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.(js|css|woff2)$/.test(entry.name))
    .map((entry) => path.relative(top, path.join(entry.parentPath, entry.name)).split(path.sep))
    .map((steps) => `/_next/static/${steps.map(encodeURIComponent).join('/')}`)
    .sort()
}

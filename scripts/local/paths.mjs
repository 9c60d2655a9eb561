import { fileURLToPath } from 'node:url'
import { join } from 'node:path'

/** Top folder of the checkout, without a trailing slash. */
export const root = fileURLToPath(new URL('../../', import.meta.url)).replace(/[\\/]$/, '')

/** Everything that running makes (database, secrets, mail, backups) stands here, ignored by git. */
export const dataFolder = join(root, '.data')

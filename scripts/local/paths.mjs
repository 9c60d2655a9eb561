import { fileURLToPath } from 'node:url'
import { join, resolve } from 'node:path'

/** Top folder of the checkout, without a trailing slash. */
export const root = fileURLToPath(new URL('../../', import.meta.url)).replace(/[\\/]$/, '')

/** Everything that running makes (database, secrets, mail, backups) stands here; `.data`, ignored by git, unless told otherwise. */
export const dataFolder = process.env.CHALKFOLD_DATA
  ? resolve(process.env.CHALKFOLD_DATA)
  : join(root, '.data')

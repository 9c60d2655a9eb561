/** `npm run backup [-- path.tar.gz]`: the database and the files in one dated archive, while people go on working. */
import { join, resolve } from 'node:path'
import { runMain, say } from './local/say.mjs'
import { archiveName, backUp } from './keeping/back-up.mjs'
import { backupFolder, filesFolder, withDatabase } from './keeping/installation.mjs'

await runMain(() =>
  withDatabase(async ({ url }) => {
    const [wanted] = process.argv.slice(2)
    const archive = wanted ? resolve(wanted) : join(backupFolder, archiveName(new Date()))
    const { tables, files } = await backUp({ url, files: filesFolder, archive })
    say(`Saved ${tables} tables and ${files} files to ${archive}`)
    say('It holds personal data: keep it where only you can read it, and a copy away from this machine.')
  }),
)

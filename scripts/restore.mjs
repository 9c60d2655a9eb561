/** `npm run restore -- path.tar.gz`: puts a backup into an empty database, and proves that it is the same. */
import { resolve } from 'node:path'
import { writeJson } from './local/json-file.mjs'
import { dataFolder } from './local/paths.mjs'
import { runMain, say, SetUpError } from './local/say.mjs'
import { demoFile } from './local/seed.mjs'
import { filesFolder, withDatabase } from './keeping/installation.mjs'
import { restore } from './keeping/restore.mjs'

await runMain(async () => {
  const [archive] = process.argv.slice(2)
  if (!archive) throw new SetUpError('Which backup? npm run restore -- path.tar.gz')
  await withDatabase(async ({ url, local }) => {
    const { tables, files, madeAt } = await restore({ url, files: filesFolder, archive: resolve(archive) })
    // What was saved is the workroom now: no demo is added to it.
    if (local) writeJson(demoFile(dataFolder), [])
    say(`Restored ${tables} tables and ${files} files as they were on ${madeAt}; every checksum agrees.`)
  })
})

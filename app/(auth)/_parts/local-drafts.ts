import { deleteDB, openDB } from 'idb'
import { forgetHere } from '@/app/(studio)/_data/here'
import { localNames, localStore } from '@/app/(studio)/_data/local-copy'

/** How many drafts on this device have changes that the server does not have. */
export async function countUnsent(): Promise<number> {
  let count = 0
  for (const name of await localNames()) {
    const database = await openDB(name)
    try {
      if (database.objectStoreNames.contains(localStore)) count += await database.count(localStore)
    } finally {
      database.close()
    }
  }
  return count
}

/** Takes everybody's drafts off this device, and has the other open pages leave. */
export async function forgetLocal(): Promise<void> {
  forgetHere()
  await Promise.all((await localNames()).map((name) => deleteDB(name)))
}

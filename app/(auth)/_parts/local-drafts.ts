import { openDB } from 'idb'
import { localPrefix, localStore } from '@/app/(studio)/_data/local-copy'

/** Names of the databases in which drafts wait on this device, of whoever used it. */
async function localNames(): Promise<readonly string[]> {
  if (!('indexedDB' in window) || !indexedDB.databases) return []
  const all = await indexedDB.databases()
  return all.flatMap(({ name }) => (name?.startsWith(localPrefix) ? [name] : []))
}

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

/** Takes every draft off this device. */
export async function forgetLocal(): Promise<void> {
  for (const name of await localNames()) indexedDB.deleteDatabase(name)
}

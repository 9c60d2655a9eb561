import { openDB, type IDBPDatabase } from 'idb'
import type { DraftOrder } from '@/drafting/contract'

/** What a draft looked like here when it was last changed, until the server has it. */
export interface LocalCopy {
  readonly draftId: string
  /** The saved version that it was changed from. */
  readonly base: string
  /** The id under which it is being sent: the same in every try. */
  readonly headId: string
  readonly order: DraftOrder
  readonly typed: Readonly<Record<string, string>>
  readonly changedAt: string
}

/** What the names of our databases begin with, and what they hold. */
const localPrefix = 'chalkfold:'
export const localStore = 'drafts'
export const openedStore = 'opened'

/** The database of one person in one workroom: nobody else who uses this device reads it. */
export function localName(userId: string, workroomId: string): string {
  return `${localPrefix}${userId}:${workroomId}`
}

/** Names of the databases in which drafts stand on this device, of whoever used it. */
export async function localNames(): Promise<readonly string[]> {
  if (!('indexedDB' in window) || !indexedDB.databases) return []
  const all = await indexedDB.databases()
  return all.flatMap(({ name }) => (name?.startsWith(localPrefix) ? [name] : []))
}

/** Opens a person's database on this device, making what is not there yet. The caller closes it. */
export async function openLocal(name: string): Promise<IDBPDatabase> {
  return openDB(name, 2, {
    upgrade: (database) => {
      for (const store of [localStore, openedStore])
        if (!database.objectStoreNames.contains(store))
          database.createObjectStore(store, { keyPath: 'draftId' })
    },
  })
}

/** The unsent copy of a draft, if there is one. */
export async function readLocal(name: string, draftId: string): Promise<LocalCopy | undefined> {
  const database = await openLocal(name)
  try {
    return (await database.get(localStore, draftId)) as LocalCopy | undefined
  } finally {
    database.close()
  }
}

/** Keeps a copy on this device. @throws DOMException QuotaExceededError when the device is full */
export async function writeLocal(name: string, copy: LocalCopy): Promise<void> {
  const database = await openLocal(name)
  try {
    await database.put(localStore, copy)
  } finally {
    database.close()
  }
}

/** Drops the copy once the server has it, unless it has changed since. */
export async function dropLocal(name: string, draftId: string, headId: string): Promise<void> {
  const database = await openLocal(name)
  try {
    const change = database.transaction(localStore, 'readwrite')
    const kept = (await change.store.get(draftId)) as LocalCopy | undefined
    if (kept?.headId === headId) await change.store.delete(draftId)
    await change.done
  } finally {
    database.close()
  }
}

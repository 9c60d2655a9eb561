import type { Version } from './api'
import { openLocal, openedStore } from './local-copy'

/** A draft as it was last opened or saved here, so that it opens again without the network. */
export interface OpenedDraft {
  readonly draftId: string
  readonly draft: {
    readonly id: string
    readonly name: string
    readonly head: Version
    readonly writable: boolean
    readonly shareable: boolean
  }
  readonly back: { readonly href: string; readonly label: string }
  readonly openedAt: string
}

/** So many are kept, the latest ones. */
const most = 20

async function within<T>(
  name: string,
  work: (database: Awaited<ReturnType<typeof openLocal>>) => Promise<T>,
) {
  const database = await openLocal(name)
  try {
    return await work(database)
  } finally {
    database.close()
  }
}

const newestFirst = (all: OpenedDraft[]) => all.sort((one, other) => (one.openedAt < other.openedAt ? 1 : -1))

/** Remembers a draft that was opened, and lets go of those opened long before. @throws DOMException when there is no room */
export async function rememberOpened(name: string, opened: OpenedDraft): Promise<void> {
  await within(name, async (database) => {
    const change = database.transaction(openedStore, 'readwrite')
    await change.store.put(opened)
    const all = newestFirst((await change.store.getAll()) as OpenedDraft[])
    for (const { draftId } of all.slice(most)) await change.store.delete(draftId)
    await change.done
  })
}

/** Goes on from what was saved. A draft that is not remembered (any more) stays so. */
export async function rememberSaved(name: string, draftId: string, head: Version): Promise<void> {
  await within(name, async (database) => {
    const change = database.transaction(openedStore, 'readwrite')
    const opened = (await change.store.get(draftId)) as OpenedDraft | undefined
    if (opened) await change.store.put({ ...opened, draft: { ...opened.draft, head } })
    await change.done
  })
}

/** The drafts that open without the network, the latest first. */
export async function openedDrafts(name: string): Promise<readonly OpenedDraft[]> {
  return within(name, async (database) => newestFirst((await database.getAll(openedStore)) as OpenedDraft[]))
}

/** Forgets what others opened here; what they have not saved stays, for them to save. */
export async function forgetOpened(name: string): Promise<void> {
  await within(name, (database) => database.clear(openedStore))
}

import type { DraftOrder } from '@/drafting/contract'
import type { SaveState } from '@/components/studio/save-state'
import { ask, Refused, type SaveAnswer, type Version } from './api'
import type { LocalCopy } from './local-copy'

export interface Content {
  readonly order: DraftOrder
  readonly typed: Readonly<Record<string, string>>
}

export interface AutosaveOptions {
  readonly draftId: string
  /** The version that the page was opened with. */
  readonly base: string
  readonly newId: () => string
  readonly keep: (copy: LocalCopy) => Promise<void>
  readonly drop: (headId: string) => Promise<void>
  /** The server has a version now: this is what stands there. */
  readonly onSaved?: (now: Version) => void
  readonly onState: (state: SaveState) => void
  /** Another tab or person saved first. Ours is kept beside it; the person chooses. */
  readonly onConflict: (theirs: Version) => void
}

const pause = 2000
const again = 15_000
/** What a browser lets a page send while it is being closed. */
const lastWords = 60_000

interface Head extends Content {
  readonly id: string
  readonly kind: 'auto' | 'named'
  readonly name?: string
}

/**
 * Sends what changed two seconds after the last change, and when the page is left; keeps it on this device until the server has it. One request
 * at a time; a version is sent under the same id until it is answered, so that a lost answer is a retry and not a conflict.
 */
export function createAutosave(options: AutosaveOptions) {
  const { draftId, newId, keep, drop, onSaved, onState, onConflict } = options
  let base = options.base
  let head: Head | undefined
  let sending: Promise<void> | undefined
  let timer: ReturnType<typeof setTimeout> | undefined
  let held = false

  function later(wait: number) {
    clearTimeout(timer)
    timer = setTimeout(() => void send(), wait)
  }

  function send(keepalive = false): Promise<void> {
    clearTimeout(timer)
    if (held || !head) return sending ?? Promise.resolve()
    sending ??= sendHead(head, keepalive).finally(() => {
      sending = undefined
      if (head && !held && !waitingToRetry) later(0)
    })
    return sending
  }

  let waitingToRetry = false

  async function sendHead(version: Head, keepalive: boolean) {
    const { id, kind, name, order, typed } = version
    const json = { revisionId: id, basedOn: base, order, typed, kind, name }
    onState({ kind: 'saving' })
    waitingToRetry = false
    try {
      const small = keepalive && JSON.stringify(json).length < lastWords
      const { outcome, head: now } = await ask<SaveAnswer>(`/api/drafts/${draftId}/revisions`, {
        json,
        keepalive: small,
      })
      if (outcome === 'conflict') {
        held = true
        onState({ kind: 'conflict' })
        onConflict(now)
        return
      }
      base = id
      if (head === version) head = undefined
      await drop(id).catch(() => undefined)
      onSaved?.(now)
      onState(head ? { kind: 'unsaved' } : { kind: 'saved', at: now.savedAt })
    } catch (error) {
      waitingToRetry = true
      onState(stateAfter(error))
      if (!(error instanceof Refused) || error.status >= 500 || error.status === 429) later(again)
    }
  }

  return {
    /** Call after every change that should last. */
    change(content: Content) {
      head = { ...content, id: newId(), kind: 'auto' }
      if (held) return
      onState({ kind: 'unsaved' })
      const copy: LocalCopy = {
        draftId,
        base,
        headId: head.id,
        ...content,
        changedAt: new Date().toISOString(),
      }
      keep(copy).catch((error: unknown) => {
        if (error instanceof DOMException && error.name === 'QuotaExceededError')
          onState({ kind: 'refused', message: 'This device is full: keep the page open until it is saved.' })
      })
      later(pause)
    },

    /** Takes up a copy that an earlier page left unsent, under the id it was sent with. */
    resume(copy: LocalCopy) {
      head = { order: copy.order, typed: copy.typed, id: copy.headId, kind: 'auto' }
      base = copy.base
      onState({ kind: 'unsaved' })
      return send()
    },

    /** Saves now. @returns the id of the version that stands; undefined when it could not be saved */
    async flush(): Promise<string | undefined> {
      await send()
      if (head && !held) await send()
      return head ? undefined : base
    },

    /** Saves what stands under a name, so that it is kept for ever. */
    async saveNamed(name: string, content: Content): Promise<boolean> {
      await sending
      head = { ...content, id: newId(), kind: 'named', name }
      await send()
      return head === undefined
    },

    /** After a conflict: goes on from the other version, with what stands on the table as the next one. */
    goOnFrom(theirs: Version, content: Content | undefined) {
      base = theirs.id
      onSaved?.(theirs)
      held = false
      head = content ? { ...content, id: newId(), kind: 'auto' } : undefined
      if (head) void send()
      else onState({ kind: 'saved', at: theirs.savedAt })
    },

    /** The network is back, or somebody has signed in again. */
    retry: () => send(),

    /** The page is being left. */
    leave: () => send(true),

    stop() {
      clearTimeout(timer)
    },

    base: () => base,
  }
}

export type Autosave = ReturnType<typeof createAutosave>

function stateAfter(error: unknown): SaveState {
  if (!(error instanceof Refused)) return { kind: 'offline' }
  if (error.status === 401) return { kind: 'signed-out' }
  return { kind: 'refused', message: error.message }
}

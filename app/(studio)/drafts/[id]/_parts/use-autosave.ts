'use client'

import { useEffect, useState } from 'react'
import { v7 as newId } from 'uuid'
import type { SaveState } from '@/components/studio/save-state'
import type { StudioStore } from '@/components/studio/store'
import type { Version } from '../../../_data/api'
import { createAutosave, type Content } from '../../../_data/autosave'
import { rememberSaved } from '../../../_data/opened-drafts'
import { dropLocal, localName, readLocal, writeLocal } from '../../../_data/local-copy'

interface Place {
  readonly draftId: string
  readonly head: Version
  readonly writable: boolean
  readonly userId: string
  readonly workroomId: string
}

/** What stands on the table, as it is saved. */
export function contentOf(store: StudioStore): Content {
  const { order, typed, unit } = store.get()
  return { order: { ...order, unit }, typed }
}

/** Keeps a studio's draft: on this device at once, on the server a moment later. */
export function useAutosave(store: StudioStore, { draftId, head, writable, userId, workroomId }: Place) {
  const [state, setState] = useState<SaveState>(
    writable ? { kind: 'saved', at: head.savedAt } : { kind: 'read-only' },
  )
  const [theirs, setTheirs] = useState<Version>()
  const name = localName(userId, workroomId)
  const [autosave] = useState(() =>
    createAutosave({
      draftId,
      base: head.id,
      newId,
      keep: (copy) => writeLocal(name, copy),
      drop: (headId) => dropLocal(name, draftId, headId),
      onSaved: (now) => void rememberSaved(name, draftId, now).catch(() => undefined),
      onState: setState,
      onConflict: setTheirs,
    }),
  )

  useEffect(() => {
    if (!writable) return
    let last = contentOf(store)
    const changed = () => {
      const { gesture, order, typed, unit } = store.get()
      if (gesture) return
      if (last.typed === typed && last.order.unit === unit && sameContent(last.order, order)) return
      last = contentOf(store)
      autosave.change(last)
    }
    const off = store.subscribe(changed)
    let gone = false
    void readLocal(name, draftId)
      .then((copy) => {
        if (!copy || gone) return
        store.replace({ order: copy.order, typed: copy.typed }, 'What was left unsaved here')
        last = contentOf(store)
        return autosave.resume(copy)
      })
      .catch(() => undefined)
    return () => {
      gone = true
      off()
    }
  }, [autosave, draftId, name, store, writable])

  useEffect(() => {
    const retry = () => void autosave.retry()
    const leave = () => {
      if (document.visibilityState === 'hidden') void autosave.leave()
    }
    window.addEventListener('online', retry)
    window.addEventListener('pagehide', leave)
    document.addEventListener('visibilitychange', leave)
    return () => {
      window.removeEventListener('online', retry)
      window.removeEventListener('pagehide', leave)
      document.removeEventListener('visibilitychange', leave)
      void autosave.leave()
      autosave.stop()
    }
  }, [autosave])

  return { state, theirs, settle: () => setTheirs(undefined), autosave }
}

/** The order in the store never carries the unit of words, the saved one does. */
function sameContent(saved: Content['order'], now: Content['order']): boolean {
  return JSON.stringify({ ...saved, unit: undefined }) === JSON.stringify({ ...now, unit: undefined })
}

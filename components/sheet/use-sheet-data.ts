'use client'

import { useEffect, useMemo, useState } from 'react'
import type { Handle } from '@/drafting/contract'
import type { FieldRef } from '@/components/studio/field-ref'
import { useStudio, useStudioList, useStudioState } from '@/components/studio/use-store'
import type { TagEntry } from './tags'

/** The draft's dimensions as tags; the same list until one comes, goes or changes what it stands for. */
export function useTagEntries(): readonly TagEntry[] {
  const dimensions = useStudioList((state) =>
    (state.draft?.dimensions ?? []).map(({ id, piece, shows, value, label }) =>
      JSON.stringify([id, piece, label, shows === 'value' ? value : undefined]),
    ),
  )
  return useMemo(
    () =>
      dimensions.map((text) => {
        const [id, piece, label, value] = JSON.parse(text) as [string, string, string, string | null]
        return { id, piece, label, field: value ? (`design.${value}` as FieldRef) : undefined }
      }),
    [dimensions],
  )
}

/** The points that may be dragged, found afresh after every change that lasts; none for those who only look. */
export function useHandles(): readonly Handle[] {
  const { engine, writable } = useStudio()
  const settled = useStudioState((state) => (state.gesture ? undefined : state.order))
  const [handles, setHandles] = useState<readonly Handle[]>([])

  useEffect(() => {
    if (!settled || !writable) return
    const later = setTimeout(() => {
      try {
        setHandles(engine.handles(settled))
      } catch {
        setHandles([])
      }
    }, 0)
    return () => clearTimeout(later)
  }, [engine, settled, writable])

  return handles
}

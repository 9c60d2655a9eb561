'use client'

import { useMemo } from 'react'
import { useStudioList } from '@/components/studio/use-store'

/** The names of the draft's pieces by their ids; the same map until a piece comes or goes. */
export function usePieceNames(): ReadonlyMap<string, string> {
  const names = useStudioList((state) =>
    (state.draft?.pieces ?? []).map((piece) => `${piece.id}|${piece.name}`),
  )
  return useMemo(
    () => new Map(names.map((text) => [text.slice(0, text.indexOf('|')), text.slice(text.indexOf('|') + 1)])),
    [names],
  )
}

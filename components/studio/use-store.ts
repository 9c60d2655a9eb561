'use client'

import { createContext, useContext, useRef, useSyncExternalStore } from 'react'
import type { GarmentDefinition } from '@/drafting/contract'
import type { Engine } from './engine'
import type { StudioState } from './state'
import type { StudioStore } from './store'

/** What every part of one open studio works with. */
export interface Studio {
  readonly store: StudioStore
  readonly garment: GarmentDefinition
  readonly engine: Engine
  /** False for those who may look and print only. */
  readonly writable: boolean
}

export const StudioContext = createContext<Studio | undefined>(undefined)

/** The studio around a component. @throws Error outside of one: a mistake in the page. */
export function useStudio(): Studio {
  const studio = useContext(StudioContext)
  if (!studio) throw new Error('This part belongs inside a studio.')
  return studio
}

/** One thing out of the state; the component draws again only when it changes (===). */
export function useStudioState<T>(select: (state: StudioState) => T): T {
  const { store } = useStudio()
  const read = () => select(store.get())
  return useSyncExternalStore(store.subscribe, read, read)
}

/** Like useStudioState for lists: keeps the earlier list while its entries are the same. */
export function useStudioList<T>(select: (state: StudioState) => readonly T[]): readonly T[] {
  const kept = useRef<readonly T[]>([])
  return useStudioState((state) => {
    const next = select(state)
    const same =
      next.length === kept.current.length && next.every((entry, index) => entry === kept.current[index])
    if (!same) kept.current = next
    return kept.current
  })
}

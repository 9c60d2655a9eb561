'use client'

import { useCallback, useSyncExternalStore } from 'react'

const listeners = new Set<() => void>()
const none = '[]'

function read(key: string): string {
  try {
    return window.localStorage.getItem(key) ?? none
  } catch {
    return none
  }
}

function write(key: string, ticked: readonly string[]): void {
  try {
    window.localStorage.setItem(key, JSON.stringify(ticked))
  } catch {
    // Full or forbidden: the ticks last as long as the page is open elsewhere, and nothing else is lost.
  }
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  window.addEventListener('storage', listener)
  return () => {
    listeners.delete(listener)
    window.removeEventListener('storage', listener)
  }
}

function parsed(text: string): readonly string[] {
  try {
    const ticked: unknown = JSON.parse(text)
    return Array.isArray(ticked) ? ticked.filter((id) => typeof id === 'string') : []
  } catch {
    return []
  }
}

/**
 * What has been ticked off on this device. It stays when the page is left and needs no network.
 * @param key of the version: another version of the draft begins anew
 */
export function useTicks(key: string) {
  const text = useSyncExternalStore(
    subscribe,
    () => read(key),
    () => none,
  )
  const ticked = parsed(text)
  const tick = useCallback(
    (id: string, on: boolean) => {
      const before = parsed(read(key)).filter((each) => each !== id)
      write(key, on ? [...before, id] : before)
    },
    [key],
  )
  const clear = useCallback(() => write(key, []), [key])
  return { ticked, tick, clear }
}

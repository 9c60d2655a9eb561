'use client'

import { useSyncExternalStore } from 'react'

const phone = '(max-width: 51.99rem)'

function subscribe(listener: () => void): () => void {
  const query = window.matchMedia(phone)
  query.addEventListener('change', listener)
  return () => query.removeEventListener('change', listener)
}

/** True where the studio folds into one thumb bar. */
export function useNarrow(): boolean {
  return useSyncExternalStore(
    subscribe,
    () => window.matchMedia(phone).matches,
    () => false,
  )
}

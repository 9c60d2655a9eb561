'use client'

import dynamic from 'next/dynamic'
import { createContext, useCallback, useContext, useEffect, useState, type ReactNode } from 'react'
import type { Slip } from './toast-slips'

// Pages opened by link say nothing in passing, and need not fetch what shows it.
const ToastSlips = dynamic(() => import('./toast-slips').then((part) => part.ToastSlips), { ssr: false })

const Say = createContext<(words: string) => void>(() => {})

/** Gives back the function that shows a passing message. Only for what has already happened; errors stay at their field. */
export function useToast(): (words: string) => void {
  return useContext(Say)
}

/** Holds the passing messages of the whole app, at most three; they outlive a change of pages. */
export function ToastShelf({ children }: { readonly children: ReactNode }) {
  const [slips, setSlips] = useState<readonly Slip[]>([])
  const say = useCallback((words: string) => {
    setSlips((before) => [...before.slice(-2), { id: (before.at(-1)?.id ?? 0) + 1, words }])
  }, [])
  const drop = useCallback(
    (id: number) => setSlips((before) => before.filter((other) => other.id !== id)),
    [],
  )
  return (
    <Say.Provider value={say}>
      {children}
      {slips.length > 0 && <ToastSlips slips={slips} onGone={drop} />}
    </Say.Provider>
  )
}

/** Fetches what shows a message before there is one, so that it can also say that the connection is gone. */
export function ToastReady() {
  useEffect(() => {
    void import('./toast-slips').catch(() => undefined)
  }, [])
  return null
}

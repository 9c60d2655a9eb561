'use client'

import { useCallback, useEffect, useRef, useState } from 'react'
import type { CardInput } from '@/db/shapes/card'
import { saveCard } from '../actions'

export type CardSaving =
  | { readonly kind: 'new' | 'saved' | 'unsaved' | 'saving' | 'offline' }
  | { readonly kind: 'refused'; readonly problems: readonly { field: string; message: string }[] }

const pause = 1200
const again = 10_000

/**
 * Keeps a card a moment after the last change, one request at a time, and again and again while there is no network.
 * @param isNew the card has never been saved
 * @returns its state and the function to call after every change
 */
export function useCardSaving(isNew: boolean, onFirst: () => void) {
  const [state, setState] = useState<CardSaving>({ kind: isNew ? 'new' : 'saved' })
  const waiting = useRef<CardInput>(undefined)
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)
  const busy = useRef(false)
  const fresh = useRef(isNew)
  const send = useRef<() => Promise<void>>(undefined)

  useEffect(() => {
    send.current = async () => {
      const card = waiting.current
      if (!card || busy.current) return
      busy.current = true
      waiting.current = undefined
      setState({ kind: 'saving' })
      try {
        const result = await saveCard({ ...card, isNew: fresh.current })
        busy.current = false
        if (!result.ok) return setState({ kind: 'refused', problems: result.problems })
        if (fresh.current) onFirst()
        fresh.current = false
        setState({ kind: waiting.current ? 'unsaved' : 'saved' })
      } catch {
        busy.current = false
        waiting.current ??= card
        setState({ kind: 'offline' })
        timer.current = setTimeout(() => void send.current?.(), again)
        return
      }
      if (waiting.current) void send.current?.()
    }
  }, [onFirst])

  useEffect(() => {
    const now = () => {
      clearTimeout(timer.current)
      void send.current?.()
    }
    const warn = (event: BeforeUnloadEvent) => {
      if (waiting.current || busy.current) event.preventDefault()
    }
    window.addEventListener('online', now)
    window.addEventListener('pagehide', now)
    window.addEventListener('beforeunload', warn)
    return () => {
      window.removeEventListener('online', now)
      window.removeEventListener('pagehide', now)
      window.removeEventListener('beforeunload', warn)
      now()
    }
  }, [])

  const change = useCallback((card: CardInput) => {
    waiting.current = card
    setState({ kind: 'unsaved' })
    clearTimeout(timer.current)
    timer.current = setTimeout(() => void send.current?.(), pause)
  }, [])

  return { state, change }
}

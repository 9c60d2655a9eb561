'use client'

import { Toast as Primitive } from 'radix-ui'
import { createContext, useCallback, useContext, useState, type ReactNode } from 'react'

interface Slip {
  readonly id: number
  readonly words: string
}

const Say = createContext<(words: string) => void>(() => {})

/** Gives back the function that shows a passing message. Only for what has already happened; errors stay at their field. */
export function useToast(): (words: string) => void {
  return useContext(Say)
}

/** Holds the passing messages of the whole app: at most three, six seconds each, read out politely. */
export function ToastShelf({ children }: { readonly children: ReactNode }) {
  const [slips, setSlips] = useState<readonly Slip[]>([])
  const say = useCallback((words: string) => {
    setSlips((before) => [...before.slice(-2), { id: (before.at(-1)?.id ?? 0) + 1, words }])
  }, [])

  return (
    <Say.Provider value={say}>
      <Primitive.Provider duration={6000} swipeDirection="down" label="Message">
        {children}
        {slips.map((slip) => (
          <Primitive.Root
            key={slip.id}
            onOpenChange={(open) => {
              if (!open) setSlips((before) => before.filter((other) => other.id !== slip.id))
            }}
            className="flex items-center gap-4 rounded bg-ink px-4 py-2.5 text-ground shadow-float"
          >
            <Primitive.Description className="grow">{slip.words}</Primitive.Description>
            <Primitive.Close className="min-h-8 rounded px-2 text-sm font-semibold underline underline-offset-4">
              Close
            </Primitive.Close>
          </Primitive.Root>
        ))}
        <Primitive.Viewport className="fixed inset-x-4 bottom-4 z-50 m-0 grid list-none gap-2 p-0 sm:left-auto sm:w-96" />
      </Primitive.Provider>
    </Say.Provider>
  )
}

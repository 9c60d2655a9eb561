'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'
import { Refused } from './api'

let memory: QueryClient | undefined

/**
 * The client's own memory of lists: asked again when the page is come back to, and a refusal is final. It comes with the first
 * dialog that asks for a list: the table itself needs none.
 */
export function Queries({ children }: { readonly children: ReactNode }) {
  const [client] = useState(
    () =>
      (memory ??= new QueryClient({
        defaultOptions: {
          queries: { staleTime: 10_000, retry: (count, error) => !(error instanceof Refused) && count < 2 },
        },
      })),
  )
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>
}

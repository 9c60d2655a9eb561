'use client'

import useSWR from 'swr'
import type { SharedView } from '@/app/_server/share/shared-view'

/** The link stopped working while its page was open. */
export class LinkEnded extends Error {}

async function fetched(address: string): Promise<SharedView> {
  const response = await fetch(address)
  if (response.status === 404) throw new LinkEnded()
  if (!response.ok) throw new Error(`The draft could not be fetched (${response.status}).`)
  const answer = (await response.json()) as { readonly value: SharedView }
  return answer.value
}

/**
 * What a link shows, asked again whenever the window comes to the front, so that students see the tutor's latest.
 * @param opened what the server sent with the page
 * @returns the view, or null once the link works no more
 */
export function useShared(token: string, opened: SharedView): SharedView | null {
  const { data, error } = useSWR<SharedView, Error>(`/api/shared/${token}`, fetched, {
    fallbackData: opened,
    revalidateOnMount: false,
    shouldRetryOnError: false,
    focusThrottleInterval: 2000,
  })
  return error instanceof LinkEnded ? null : (data ?? opened)
}

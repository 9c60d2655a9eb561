'use client'

import { useSyncExternalStore } from 'react'

const never = () => () => {}

/**
 * A moment in the reader's own time zone, such as '1 December 2026 at 14:05'. Where the page is made nobody knows that zone:
 * until the page is alive the moment stands there in UTC, and says so.
 * @param at ISO 8601
 */
export function Moment({ at }: { readonly at: string }) {
  const words = useSyncExternalStore(
    never,
    () => momentWords(at),
    () => momentWords(at, 'UTC'),
  )
  return <time dateTime={at}>{words}</time>
}

function momentWords(at: string, timeZone?: 'UTC'): string {
  const words = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone })
  return words.format(new Date(at)) + (timeZone ? ` ${timeZone}` : '')
}

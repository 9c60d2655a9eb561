import 'server-only'
import { notFound } from 'next/navigation'
import { AccessError } from '@/db/access-error'

/** What a page shows. What does not exist, or is not for this person to see, becomes the not-found page. */
export async function forPage<T>(work: Promise<T>): Promise<T> {
  try {
    return await work
  } catch (error) {
    if (error instanceof AccessError && (error.status === 404 || error.status === 403)) notFound()
    throw error
  }
}

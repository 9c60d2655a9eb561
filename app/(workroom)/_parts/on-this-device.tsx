'use client'

import { useEffect } from 'react'
import { enter } from '@/app/(auth)/_parts/enter'
import { noteHere, onSignedOut } from '@/app/(studio)/_data/here'

/**
 * What a signed-in page does for its device: notes who is here, has the worker keep this build for times without network,
 * and leaves when somebody signs out in another page.
 */
export function OnThisDevice({
  build,
  userId,
  workroomId,
}: {
  /** null when the application is served from its sources. */
  readonly build: string | null
  readonly userId: string
  readonly workroomId: string
}) {
  useEffect(() => {
    // A browser that keeps nothing (a private window, say) works with the network all the same.
    void noteHere(userId, workroomId).catch(() => undefined)
    return onSignedOut(() => enter('/sign-in'))
  }, [userId, workroomId])

  useEffect(() => {
    if (build === null || !('serviceWorker' in navigator)) return
    const address = `/sw.js?build=${encodeURIComponent(build)}`
    void navigator.serviceWorker.register(address, { updateViaCache: 'none' }).catch(() => undefined)
  }, [build])
  return null
}

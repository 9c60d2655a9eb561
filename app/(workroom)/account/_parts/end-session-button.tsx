'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { useToast } from '@/components/ui/toast'
import { endSession } from '../actions'

/** Signs one other device out. */
export function EndSessionButton({ id, device }: { readonly id: string; readonly device: string }) {
  const [busy, setBusy] = useState(false)
  const router = useRouter()
  const say = useToast()

  async function end() {
    setBusy(true)
    const answer = await endSession({ id }).catch(() => null)
    setBusy(false)
    say(
      answer?.ok
        ? `${device} is signed out.`
        : (answer?.problems[0]?.message ?? 'This could not be sent. Check the connection and try again.'),
    )
    router.refresh()
  }

  return (
    <Button busy={busy} onClick={() => void end()} aria-label={`Sign out ${device}`}>
      Sign out
    </Button>
  )
}

'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { useToast } from '@/components/ui/toast'
import { withdraw } from '../actions'

/** Takes an invitation back. */
export function WithdrawButton({ id, email }: { readonly id: string; readonly email: string }) {
  const [busy, setBusy] = useState(false)
  const router = useRouter()
  const say = useToast()

  async function takeBack() {
    setBusy(true)
    const answer = await withdraw({ id }).catch(() => null)
    setBusy(false)
    say(
      answer?.ok
        ? `The link that ${email} got works no more.`
        : (answer?.problems[0]?.message ?? 'This could not be sent. Check the connection and try again.'),
    )
    router.refresh()
  }

  return (
    <Button
      look="quiet"
      className="-ml-4 sm:-mr-4 sm:ml-0"
      busy={busy}
      onClick={() => void takeBack()}
      aria-label={`Withdraw ${email}`}
    >
      Withdraw
    </Button>
  )
}

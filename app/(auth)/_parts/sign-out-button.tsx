'use client'

import { LogOut } from 'lucide-react'
import { useState } from 'react'
import { Button, type ButtonLook } from '@/components/ui/button'
import { useToast } from '@/components/ui/toast'
import { signOut } from '../actions'
import { enter } from './sign-in-with'

/** Signs out on this device and in the database. */
export function SignOutButton({
  to = '/sign-in',
  look = 'plain',
}: {
  readonly to?: string
  readonly look?: ButtonLook
}) {
  const [busy, setBusy] = useState(false)
  const say = useToast()

  async function leave() {
    setBusy(true)
    const answer = await signOut({}).catch(() => null)
    if (answer?.ok) return enter(to)
    setBusy(false)
    say('You are still signed in: this could not be sent. Check the connection and try again.')
  }

  return (
    <Button look={look} busy={busy} onClick={() => void leave()}>
      <LogOut size={18} aria-hidden />
      Sign out
    </Button>
  )
}

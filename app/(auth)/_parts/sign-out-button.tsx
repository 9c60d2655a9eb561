'use client'

import { LogOut } from 'lucide-react'
import { useState } from 'react'
import { Button, type ButtonLook } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { useToast } from '@/components/ui/toast'
import { signOut } from '../actions'
import { countUnsent, forgetLocal } from './local-drafts'
import { enter } from './enter'

/** Signs out on this device and in the database. Held back with a choice while a draft on this device is unsaved. */
export function SignOutButton({
  to = '/sign-in',
  look = 'plain',
}: {
  readonly to?: string
  readonly look?: ButtonLook
}) {
  const [busy, setBusy] = useState(false)
  const [unsent, setUnsent] = useState(0)
  const say = useToast()

  async function ask() {
    setBusy(true)
    const count = await countUnsent().catch(() => 0)
    if (count > 0) {
      setBusy(false)
      setUnsent(count)
    } else await leave()
  }

  async function leave() {
    setBusy(true)
    const answer = await signOut({}).catch(() => null)
    if (answer?.ok) {
      await forgetLocal().catch(() => undefined)
      return enter(to)
    }
    setBusy(false)
    say('You are still signed in: this could not be sent. Check the connection and try again.')
  }

  return (
    <>
      <Button look={look} busy={busy} onClick={() => void ask()}>
        <LogOut size={18} aria-hidden />
        Sign out
      </Button>
      <Dialog open={unsent > 0} onClose={() => setUnsent(0)} title="Not everything is saved">
        <p>
          {unsent === 1 ? 'One draft has changes' : `${unsent} drafts have changes`} that are only on this
          device. Open it once more to save it, or sign out and lose them.
        </p>
        <div className="mt-6 flex flex-wrap gap-3">
          <Button look="primary" onClick={() => setUnsent(0)}>
            Stay
          </Button>
          <Button look="danger" busy={busy} onClick={() => void leave()}>
            Sign out and lose them
          </Button>
        </div>
      </Dialog>
    </>
  )
}

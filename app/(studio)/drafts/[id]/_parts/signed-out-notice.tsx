'use client'

import { Button, buttonClass } from '@/components/ui/button'
import { Note } from '@/components/ui/error-note'

/** The session has ended: what is on the table stays, and signing in again in another tab goes on from here. */
export function SignedOutNotice({ onBack }: { readonly onBack: () => void }) {
  return (
    <Note kind="caution" className="border-b hairline">
      <div role="alert" className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p className="min-w-0 flex-1 basis-64">
          You are signed out. What you changed is kept on this device: sign in again in a new tab, then save.
        </p>
        <a href="/sign-in" target="_blank" rel="noreferrer" className={buttonClass('plain')}>
          Sign in
        </a>
        <Button look="primary" onClick={onBack}>
          Save now
        </Button>
      </div>
    </Note>
  )
}

'use client'

import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

/** The last resort: says that it was our fault, gives the reference for the log, and tries again in place. */
export default function ErrorPage({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <main className="grid min-h-[70dvh] place-items-center">
      <EmptyState
        title="Something went wrong here"
        action={
          <Button look="primary" onClick={reset}>
            Try again
          </Button>
        }
      >
        <p>
          It is our fault, not yours. What you had typed in a draft is kept on this device.
          {error.digest && ` Reference ${error.digest}.`}
        </p>
      </EmptyState>
    </main>
  )
}

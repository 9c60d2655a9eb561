'use client'

import { homePath } from '@/app/_server/session/safe-path'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { enter } from '../../_parts/enter'
import { acceptKnown } from '../actions'

export function AcceptButton({ token }: { readonly token: string }) {
  const form = useActionForm(acceptKnown, () => enter(homePath))
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorNote>{form.errorBeside()}</ErrorNote>
      <input type="hidden" name="token" value={token} />
      <Button type="submit" look="primary" busy={form.busy}>
        Accept
      </Button>
    </form>
  )
}

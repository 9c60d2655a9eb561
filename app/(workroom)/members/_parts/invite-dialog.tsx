'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { useToast } from '@/components/ui/toast'
import { invite } from '../actions'
import { RoleBoxes } from './role-boxes'

/** The button that invites somebody, and its form. */
export function InviteDialog() {
  const [id, setId] = useState<string>()
  return (
    <>
      <Button look="primary" onClick={() => setId(newId())}>
        Invite somebody
      </Button>
      <Dialog open={id !== undefined} title="Invite somebody" onClose={() => setId(undefined)}>
        {id && <InviteForm id={id} onDone={() => setId(undefined)} />}
      </Dialog>
    </>
  )
}

function InviteForm({ id, onDone }: { readonly id: string; readonly onDone: () => void }) {
  const router = useRouter()
  const say = useToast()
  const form = useActionForm(invite, ({ email }) => {
    say(`An invitation is on its way to ${email}.`)
    onDone()
    router.refresh()
  })
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
      <ErrorNote>{form.errorBeside('email', 'roles')}</ErrorNote>
      <input type="hidden" name="id" value={id} />
      <Field
        label="E-mail address"
        name="email"
        type="email"
        autoComplete="off"
        hint="They get a link that works once, for a week."
        error={form.errorOf('email')}
      />
      <RoleBoxes error={form.errorOf('roles')} />
      <Button type="submit" look="primary" busy={form.busy} className="justify-self-start">
        Send the invitation
      </Button>
    </form>
  )
}

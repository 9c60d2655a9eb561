'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { ErrorNote } from '@/components/ui/error-note'
import { useToast } from '@/components/ui/toast'
import type { Member } from '@/db/access/members'
import { setDisabled, setRoles } from '../actions'
import { RoleBoxes } from './role-boxes'

/** What an owner may do with one member. */
export function MemberActions({ member }: { readonly member: Member }) {
  const [open, setOpen] = useState(false)
  return (
    <>
      <Button
        look="quiet"
        className="-ml-4 sm:-mr-4 sm:ml-0"
        onClick={() => setOpen(true)}
        aria-label={`Change ${member.name}`}
      >
        Change
      </Button>
      <Dialog open={open} title={member.name} onClose={() => setOpen(false)}>
        <div className="grid gap-8">
          {!member.disabled && <RolesForm member={member} onDone={() => setOpen(false)} />}
          <DoorForm member={member} onDone={() => setOpen(false)} />
        </div>
      </Dialog>
    </>
  )
}

interface FormProps {
  readonly member: Member
  readonly onDone: () => void
}

function useDone(words: string, onDone: () => void) {
  const router = useRouter()
  const say = useToast()
  return () => {
    say(words)
    onDone()
    router.refresh()
  }
}

function RolesForm({ member, onDone }: FormProps) {
  const form = useActionForm(setRoles, useDone(`The roles of ${member.name} are changed.`, onDone))
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorNote>{form.errorBeside('roles')}</ErrorNote>
      <input type="hidden" name="membershipId" value={member.membershipId} />
      <RoleBoxes held={member.roles} error={form.errorOf('roles')} />
      <Button type="submit" look="primary" busy={form.busy} className="justify-self-start">
        Save the roles
      </Button>
    </form>
  )
}

function DoorForm({ member, onDone }: FormProps) {
  const { membershipId, disabled, name } = member
  const words = disabled ? `${name} may come in again.` : `${name} is shut out, on every device.`
  const form = useActionForm(() => setDisabled({ membershipId, disabled: !disabled }), useDone(words, onDone))
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-3 border-t hairline pt-5">
      <ErrorNote>{form.errorBeside()}</ErrorNote>
      <p className="text-walnut">
        {disabled
          ? 'Shut out at the moment. Letting in brings back the same roles.'
          : 'Shutting out ends their access to this workroom at once. What they made stays.'}
      </p>
      <Button
        type="submit"
        look={disabled ? 'plain' : 'danger'}
        busy={form.busy}
        className="justify-self-start"
      >
        {disabled ? 'Let in again' : 'Shut out'}
      </Button>
    </form>
  )
}

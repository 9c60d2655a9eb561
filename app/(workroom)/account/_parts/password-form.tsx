'use client'

import { PasswordField } from '@/components/forms/password-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { useToast } from '@/components/ui/toast'
import { setPassword } from '../actions'

export function PasswordForm({ email }: { readonly email: string }) {
  const say = useToast()
  const form = useActionForm(
    (fields) => {
      fields.delete('email')
      return setPassword(fields)
    },
    () => say('The password is changed, and every other device is signed out.'),
  )
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid max-w-105 gap-5" noValidate>
      <ErrorNote>{form.errorBeside('current', 'next')}</ErrorNote>
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        label="Present password"
        name="current"
        autoComplete="current-password"
        error={form.errorOf('current')}
      />
      <PasswordField
        label="New password"
        name="next"
        autoComplete="new-password"
        hint="At least 10 characters: three or four words are easy to remember."
        error={form.errorOf('next')}
      />
      <Button type="submit" look="primary" busy={form.busy} className="justify-self-start">
        Change the password
      </Button>
    </form>
  )
}

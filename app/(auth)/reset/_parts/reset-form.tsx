'use client'

import { homePath } from '@/app/_server/session/safe-path'
import { PasswordField } from '@/components/forms/password-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { enter } from '../../_parts/enter'
import { signInWith } from '../../_parts/sign-in-with'
import { reset } from '../actions'

export function ResetForm({ token, email }: { readonly token: string; readonly email: string }) {
  const form = useActionForm(
    (fields) => {
      fields.delete('email')
      return reset(fields)
    },
    async (_done, fields) => {
      await signInWith(email, String(fields.get('password')))
      enter(homePath)
    },
  )
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
      <ErrorNote>{form.errorBeside('password')}</ErrorNote>
      <input type="hidden" name="token" value={token} />
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        label="New password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters: three or four words are easy to remember."
        error={form.errorOf('password')}
      />
      <Button type="submit" look="primary" busy={form.busy}>
        Set the password
      </Button>
    </form>
  )
}

'use client'

import { homePath } from '@/app/_server/session/safe-path'
import { PasswordField } from '@/components/forms/password-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { enter } from '../../_parts/enter'
import { signInWith } from '../../_parts/sign-in-with'
import { accept } from '../actions'

export function AcceptForm({ token, email }: { readonly token: string; readonly email: string }) {
  const form = useActionForm(
    (fields) => {
      fields.delete('email')
      return accept(fields)
    },
    async (_done, fields) => {
      await signInWith(email, String(fields.get('password')))
      enter(homePath)
    },
  )
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
      <ErrorNote>{form.errorBeside('name', 'password')}</ErrorNote>
      <input type="hidden" name="token" value={token} />
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <Field label="Your name" name="name" autoComplete="name" error={form.errorOf('name')} />
      <PasswordField
        label="Password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters: three or four words are easy to remember."
        error={form.errorOf('password')}
      />
      <Button type="submit" look="primary" busy={form.busy}>
        Accept
      </Button>
    </form>
  )
}

'use client'

import { PasswordField } from '@/components/forms/password-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { enter } from '../../_parts/enter'
import { signInWith } from '../../_parts/sign-in-with'

export function SignInForm({ next }: { readonly next: string }) {
  const form = useActionForm(
    (fields) => signInWith(String(fields.get('email')), String(fields.get('password'))),
    () => enter(next),
  )
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorNote>{form.errorBeside()}</ErrorNote>
      <Field label="E-mail address" name="email" type="email" autoComplete="username" required />
      <PasswordField label="Password" name="password" autoComplete="current-password" required />
      <Button type="submit" look="primary" busy={form.busy}>
        Sign in
      </Button>
    </form>
  )
}

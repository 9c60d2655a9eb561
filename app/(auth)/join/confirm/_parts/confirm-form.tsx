'use client'

import { homePath } from '@/app/_server/session/safe-path'
import { PasswordField } from '@/components/forms/password-field'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Select } from '@/components/ui/select'
import { enter } from '../../../_parts/enter'
import { signInWith } from '../../../_parts/sign-in-with'
import { confirm } from '../../actions'

const units = [
  { value: 'in', label: 'Inches with fractions' },
  { value: 'cm', label: 'Centimetres' },
]

export function ConfirmForm({ token, email }: { readonly token: string; readonly email: string }) {
  const form = useActionForm(
    (fields) => {
      fields.set('timeZone', Intl.DateTimeFormat().resolvedOptions().timeZone)
      fields.delete('email')
      return confirm(fields)
    },
    async (_joined, fields) => {
      await signInWith(email, String(fields.get('password')))
      enter(homePath)
    },
  )
  return (
    <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
      <ErrorNote>{form.errorBeside('password', 'unit')}</ErrorNote>
      <input type="hidden" name="token" value={token} />
      {/* For password managers, which keep a password under its address. */}
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <PasswordField
        label="Password"
        name="password"
        autoComplete="new-password"
        hint="At least 10 characters: three or four words are easy to remember."
        error={form.errorOf('password')}
      />
      <Select
        label="You measure in"
        name="unit"
        choices={units}
        hint="Each card and each draft can use the other one."
        error={form.errorOf('unit')}
      />
      <Button type="submit" look="primary" busy={form.busy}>
        Open the workroom
      </Button>
    </form>
  )
}

'use client'

import { type ReactNode, useState } from 'react'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { FormSheet } from '../../_parts/form-sheet'
import { MailSent } from '../../_parts/mail-sent'
import { TextLink } from '../../_parts/text-link'
import { askForReset } from '../actions'

export function ForgottenForm({ mailbox }: { readonly mailbox: ReactNode }) {
  const [sentTo, setSentTo] = useState<string>()
  const form = useActionForm(askForReset, ({ email }) => setSentTo(email))
  if (sentTo)
    return (
      <MailSent to={sentTo} mailbox={mailbox}>
        Open the link in it to choose a new password. It works once, for an hour.
      </MailSent>
    )
  return (
    <FormSheet
      title="Forgotten password"
      lead="We send you a link to choose a new one. Every device is signed out then."
      foot={<TextLink href="/sign-in">Back to sign-in</TextLink>}
    >
      <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
        <ErrorNote>{form.errorBeside('email')}</ErrorNote>
        <Field
          label="E-mail address"
          name="email"
          type="email"
          autoComplete="username"
          error={form.errorOf('email')}
        />
        <Button type="submit" look="primary" busy={form.busy}>
          Send the link
        </Button>
      </form>
    </FormSheet>
  )
}

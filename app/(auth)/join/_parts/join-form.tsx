'use client'

import { type ReactNode, useState } from 'react'
import { useActionForm } from '@/components/forms/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { FormSheet } from '../../_parts/form-sheet'
import { MailSent } from '../../_parts/mail-sent'
import { TextLink } from '../../_parts/text-link'
import { join } from '../actions'

export function JoinForm({ mailbox }: { readonly mailbox: ReactNode }) {
  const [sentTo, setSentTo] = useState<string>()
  const form = useActionForm(join, ({ email }) => setSentTo(email))
  if (sentTo)
    return (
      <MailSent to={sentTo} mailbox={mailbox}>
        Open the link in it to choose a password. It works once, for a day.
      </MailSent>
    )
  return (
    <FormSheet
      title="Open a workroom"
      lead="A workroom holds your clients, their measurements and your drafts. Others can be invited later."
      foot={
        <p>
          You have an account? <TextLink href="/sign-in">Sign in</TextLink>
        </p>
      }
    >
      <form method="post" onSubmit={form.onSubmit} className="grid gap-5" noValidate>
        <ErrorNote>{form.errorBeside('name', 'workroomName', 'email')}</ErrorNote>
        <Field label="Your name" name="name" autoComplete="name" error={form.errorOf('name')} />
        <Field
          label="Name of the workroom"
          name="workroomName"
          autoComplete="organization"
          hint="Your business, your school, or your own name."
          error={form.errorOf('workroomName')}
        />
        <Field
          label="E-mail address"
          name="email"
          type="email"
          autoComplete="email"
          hint="We send a link there to confirm it."
          error={form.errorOf('email')}
        />
        <Button type="submit" look="primary" busy={form.busy}>
          Join
        </Button>
      </form>
    </FormSheet>
  )
}

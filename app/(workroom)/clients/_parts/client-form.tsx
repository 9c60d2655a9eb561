'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition, type FormEvent } from 'react'
import { v7 as newId } from 'uuid'
import { Button, ButtonLink } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field, TextField } from '@/components/ui/field'
import { saveClient } from '../actions'

interface Known {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly phone: string
  readonly note: string
}

const unreached = 'The server could not be reached. What you typed is still here: try again.'

/** Name and contact of a client, new or known. */
export function ClientForm({ client }: { readonly client?: Known }) {
  const router = useRouter()
  const [id] = useState(() => client?.id ?? newId())
  const [problems, setProblems] = useState<readonly { field: string; message: string }[]>([])
  const [busy, start] = useTransition()
  const problem = (field: string) => problems.find((each) => each.field === field)?.message

  function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const form = new FormData(event.currentTarget)
    const text = (name: string) => String(form.get(name) ?? '')
    start(async () => {
      try {
        const result = await saveClient({
          id,
          name: text('name'),
          email: text('email'),
          phone: text('phone'),
          note: text('note'),
          isNew: !client,
        })
        if (result.ok) router.push(`/clients/${id}`)
        else setProblems(result.problems)
      } catch {
        setProblems([{ field: '', message: unreached }])
      }
    })
  }

  return (
    <form onSubmit={submit} noValidate className="grid max-w-130 gap-5">
      <ErrorNote>{problem('') ?? problem('id')}</ErrorNote>
      <Field
        label="Name"
        name="name"
        defaultValue={client?.name}
        error={problem('name')}
        autoComplete="off"
        required
      />
      <Field
        label="Telephone"
        name="phone"
        type="tel"
        defaultValue={client?.phone}
        error={problem('phone')}
        autoComplete="off"
      />
      <Field
        label="E-mail"
        name="email"
        type="email"
        defaultValue={client?.email}
        error={problem('email')}
        autoComplete="off"
      />
      <TextField
        label="Notes"
        name="note"
        defaultValue={client?.note}
        error={problem('note')}
        hint="What to remember at the next fitting."
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" look="primary" busy={busy}>
          {client ? 'Save' : 'Add this client'}
        </Button>
        <ButtonLink href={client ? `/clients/${client.id}` : '/clients'} look="quiet">
          Leave it
        </ButtonLink>
      </div>
    </form>
  )
}

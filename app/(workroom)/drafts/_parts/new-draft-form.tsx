'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition, type FormEvent } from 'react'
import { v7 as newId } from 'uuid'
import { classes } from '@/components/ui/classes'
import { Button } from '@/components/ui/button'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { GarmentPicture } from '@/components/forms/garment-picture'
import { startDraft } from '../actions'

interface Named {
  readonly id: string
  readonly name: string
}

interface Method extends Named {
  readonly description: string
}

/** A garment, a measure card, a name: what a draft starts from. */
export function NewDraftForm({
  garments,
  cards,
  sizes,
  methods,
  cardId,
}: {
  readonly garments: readonly Named[]
  readonly cards: readonly Named[]
  /** Published sizes, where the draft is for nobody in particular. */
  readonly sizes: readonly Named[]
  /** Built in, and the workroom's own. */
  readonly methods: readonly Method[]
  readonly cardId: string | undefined
}) {
  const router = useRouter()
  const [ids] = useState(() => ({ id: newId(), revisionId: newId() }))
  const [garment, setGarment] = useState(garments[0]?.id ?? '')
  const [body, setBody] = useState(
    (cards.find((each) => each.id === cardId) ?? cards[0] ?? sizes[0])?.id ?? '',
  )
  const [method, setMethod] = useState(methods[0]?.id ?? '')
  const onCard = cards.some((each) => each.id === body)
  const [named, setNamed] = useState<string>()
  const [problems, setProblems] = useState<readonly { field: string; message: string }[]>([])
  const [busy, start] = useTransition()
  const name = named ?? garments.find((each) => each.id === garment)?.name ?? ''
  const problem = (field: string) => problems.find((each) => each.field === field)?.message

  function submit(event: FormEvent) {
    event.preventDefault()
    start(async () => {
      try {
        const result = await startDraft({
          ...ids,
          name,
          garment,
          methodId: method,
          ...(onCard ? { cardId: body } : { sizeId: body }),
        })
        if (result.ok) router.push(`/drafts/${ids.id}`)
        else setProblems(result.problems)
      } catch {
        setProblems([{ field: '', message: 'The server could not be reached. Nothing is lost: try again.' }])
      }
    })
  }

  return (
    <form onSubmit={submit} noValidate className="grid gap-6">
      <ErrorNote>{problem('') ?? problem('id') ?? problem('garment') ?? problem('order')}</ErrorNote>
      <fieldset>
        <legend className="mb-2 text-sm font-semibold">Garment</legend>
        <div className="grid grid-cols-2 gap-3 sm:grid-cols-3">
          {garments.map((each) => (
            <label
              key={each.id}
              className={classes(
                'grid cursor-pointer justify-items-center gap-2 border bg-sheet p-4 has-focus-visible:outline-2 has-focus-visible:outline-indigo',
                garment === each.id ? 'border-indigo' : 'hairline',
              )}
            >
              <input
                type="radio"
                name="garment"
                value={each.id}
                checked={garment === each.id}
                onChange={() => setGarment(each.id)}
                className="sr-only"
              />
              <GarmentPicture garment={each.id} className="h-32" />
              <span className={garment === each.id ? 'font-semibold' : undefined}>{each.name}</span>
            </label>
          ))}
        </div>
      </fieldset>
      <Select
        label={sizes.length > 0 ? 'Measurements' : 'Measure card'}
        value={body}
        onChange={(event) => setBody(event.target.value)}
        error={problem('cardId') ?? problem('sizeId')}
        choices={[...cards, ...sizes].map((each) => ({ value: each.id, label: each.name }))}
      />
      <Select
        label="Drafting method"
        value={method}
        onChange={(event) => setMethod(event.target.value)}
        error={problem('methodId')}
        hint={methods.find((each) => each.id === method)?.description}
        choices={methods.map((each) => ({ value: each.id, label: each.name }))}
      />
      <Field
        label="Name of the draft"
        value={name}
        onChange={(event) => setNamed(event.target.value)}
        error={problem('name')}
        hint="As you will look for it: Wedding guest dress, Sunday skirt."
      />
      <div>
        <Button type="submit" look="primary" busy={busy}>
          Start drafting
        </Button>
      </div>
    </form>
  )
}

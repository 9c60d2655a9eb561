'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition, type FormEvent } from 'react'
import { v7 as newId } from 'uuid'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { ErrorNote } from '@/components/ui/error-note'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { useToast } from '@/components/ui/toast'
import { startDraft } from '../actions'
import { GarmentChoice } from './garment-choice'
import type { PicturedGarment } from './garment-pictures'
import type { SizeTable } from './published-sizes'

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
  blocks,
  first,
  teachable,
}: {
  readonly garments: readonly PicturedGarment[]
  readonly cards: readonly Named[]
  /** Published sizes, where the draft is for nobody in particular. */
  readonly sizes: readonly SizeTable[]
  /** Built in, and the workroom's own. */
  readonly methods: readonly Method[]
  /** In words, the client's blocks. */
  readonly blocks: readonly string[]
  /** The card or the size that the choice begins with. */
  readonly first: string
  /** Whether the person may make it a teaching draft, which others may read. */
  readonly teachable: boolean
}) {
  const router = useRouter()
  const [ids] = useState(() => ({ id: newId(), revisionId: newId() }))
  const [garment, setGarment] = useState(garments[0]?.id ?? '')
  const [body, setBody] = useState(first)
  const [teaching, setTeaching] = useState(false)
  const table = sizes.find((each) => each.sizes.some(({ id }) => id === body))
  const [method, setMethod] = useState(methods[0]?.id ?? '')
  const [fromBlock, setFromBlock] = useState(blocks.length > 0)
  const say = useToast()
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
          fromBlock: fromBlock && onCard,
          ...(onCard ? { cardId: body } : { sizeId: body }),
          ...(teaching ? { purpose: 'teaching' } : {}),
        })
        if (result.ok) {
          if (result.value.left.length > 0) say(`Left in the block: ${result.value.left.join('; ')}.`)
          router.push(`/drafts/${ids.id}`)
        } else setProblems(result.problems)
      } catch {
        setProblems([{ field: '', message: 'The server could not be reached. Nothing is lost: try again.' }])
      }
    })
  }

  return (
    <form onSubmit={submit} noValidate className="grid gap-6">
      <ErrorNote>{problem('') ?? problem('id') ?? problem('garment') ?? problem('order')}</ErrorNote>
      <GarmentChoice garments={garments} chosen={garment} onChoose={setGarment} />
      <Select
        label={sizes.length > 0 ? 'Measurements' : 'Measure card'}
        value={body}
        onChange={(event) => setBody(event.target.value)}
        error={problem('cardId') ?? problem('sizeId')}
        hint={table && `A published size of ${table.name}.`}
        choices={cards.map((each) => ({ value: each.id, label: each.name }))}
        groups={sizes.map((table) => ({
          label: table.name,
          choices: table.sizes.map((size) => ({ value: size.id, label: size.name })),
        }))}
      />
      <Select
        label="Drafting method"
        value={method}
        onChange={(event) => setMethod(event.target.value)}
        error={problem('methodId')}
        hint={methods.find((each) => each.id === method)?.description}
        choices={methods.map((each) => ({ value: each.id, label: each.name }))}
      />
      {blocks.length > 0 && onCard && (
        <Checkbox
          label="Start from the client’s block"
          hint={`${blocks.join('; ')}. Its corrections come along where this garment has the same points and rules.`}
          checked={fromBlock}
          onChange={(event) => setFromBlock(event.target.checked)}
        />
      )}
      <Field
        label="Name of the draft"
        value={name}
        onChange={(event) => setNamed(event.target.value)}
        error={problem('name')}
        hint="As you will look for it: Wedding guest dress, Sunday skirt."
      />
      {teachable && (
        <Checkbox
          label="A teaching draft"
          hint="The workroom’s tutors may read it, and its students once it is shared by link."
          checked={teaching}
          onChange={(event) => setTeaching(event.target.checked)}
        />
      )}
      <div>
        <Button type="submit" look="primary" busy={busy}>
          Start drafting
        </Button>
      </div>
    </form>
  )
}

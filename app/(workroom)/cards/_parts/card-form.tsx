'use client'

import { Check, Scissors } from 'lucide-react'
import { useCallback, useMemo, useState } from 'react'
import { CardTape } from '@/components/tape/card-tape'
import { ButtonLink } from '@/components/ui/button'
import { classes } from '@/components/ui/classes'
import { ErrorNote } from '@/components/ui/error-note'
import { Field, TextField } from '@/components/ui/field'
import { measurements } from '@/drafting/body'
import {
  cautionsByField,
  estimatesByField,
  fieldText,
  readValue,
  type Kept,
  type OpenValues,
  type Unit,
} from './card-values'
import { useCardSaving, type CardSaving } from './use-card-saving'

export interface OpenCard {
  readonly id: string
  readonly clientId: string | null
  readonly name: string
  readonly takenOn: string
  readonly unit: Unit
  readonly note: string
  readonly values: Readonly<Record<string, Kept>>
}

const words: Record<CardSaving['kind'], string> = {
  new: 'Kept as soon as you type',
  saved: 'Saved',
  unsaved: 'Not saved yet',
  saving: 'Saving…',
  offline: 'Offline: trying again',
  refused: 'Not saved',
}

/** A measure card with its tape. It keeps itself. */
export function CardForm({
  card,
  isNew,
  readOnly,
  usual,
  draftable,
}: {
  readonly card: OpenCard
  readonly isNew: boolean
  readonly readOnly: boolean
  /** The person may draft from it. */
  readonly draftable: boolean
  /** Measurements that our garments ask for; the others are shown on request. */
  readonly usual: readonly string[]
}) {
  const [details, setDetails] = useState({
    name: card.name,
    takenOn: card.takenOn,
    unit: card.unit,
    note: card.note,
  })
  const [values, setValues] = useState<OpenValues>(() =>
    Object.fromEntries(Object.entries(card.values).map(([id, kept]) => [id, { kept }])),
  )
  const [focused, setFocused] = useState<string>()
  const [all, setAll] = useState(false)
  const first = useCallback(() => window.history.replaceState(null, '', `/cards/${card.id}`), [card.id])
  const { state, change } = useCardSaving(isNew, first)
  const { unit } = details

  function keep(next: { details?: typeof details; values?: OpenValues }) {
    const own = next.details ?? details
    const open = next.values ?? values
    if (next.details) setDetails(own)
    if (next.values) setValues(open)
    const kept = Object.entries(open).flatMap(([id, value]) =>
      value.kept ? [[id, value.kept] as const] : [],
    )
    change({ id: card.id, clientId: card.clientId, ...own, values: Object.fromEntries(kept) })
  }

  const cautions = useMemo(() => cautionsByField(values, unit), [values, unit])
  const estimated = useMemo(() => estimatesByField(values, unit), [values, unit])
  const shown = measurements.filter(({ id }) => all || usual.includes(id) || values[id])
  const rows = shown.map(({ id, name, how }) => ({
    id,
    name,
    how,
    text: fieldText(values[id] ?? {}, unit),
    error: values[id]?.refused?.message,
    caution: cautions[id],
    estimate: estimated[id],
  }))
  const problem = (field: string) =>
    state.kind === 'refused' ? state.problems.find((each) => each.field === field)?.message : undefined
  const others =
    state.kind === 'refused'
      ? state.problems.filter((each) => !['name', 'takenOn', 'note'].includes(each.field))
      : []

  return (
    <div className="grid gap-6">
      <div className="flex flex-wrap items-end gap-4">
        <Field
          label="Name of the card"
          className="w-full sm:w-72"
          value={details.name}
          readOnly={readOnly}
          error={problem('name')}
          onChange={(event) => keep({ details: { ...details, name: event.target.value } })}
        />
        <Field
          label="Taken on"
          type="date"
          className="w-44"
          value={details.takenOn}
          readOnly={readOnly}
          error={problem('takenOn')}
          onChange={(event) => keep({ details: { ...details, takenOn: event.target.value } })}
        />
        <UnitChoice unit={unit} onUnit={(next) => keep({ details: { ...details, unit: next } })} />
        <div className="ml-auto flex flex-wrap items-center gap-4">
          {!readOnly && (
            <p role="status" className={classes('flex min-h-10 items-center gap-1.5 text-sm', tone(state))}>
              {state.kind === 'saved' && <Check size={16} aria-hidden />}
              {words[state.kind]}
            </p>
          )}
          {draftable && state.kind !== 'new' && (
            <ButtonLink href={draftAddress(card)} look="primary">
              <Scissors size={18} aria-hidden />
              Draft from this card
            </ButtonLink>
          )}
        </div>
      </div>
      <ErrorNote>{others.map((each) => each.message).join(' ')}</ErrorNote>
      <CardTape
        rows={rows}
        unit={unit}
        focused={focused}
        readOnly={readOnly}
        onFocus={setFocused}
        onType={(id, text) =>
          keep({ values: { ...values, [id]: readValue(id, text, unit, values[id] ?? {}) } })
        }
        onLeave={() => setFocused(undefined)}
      >
        {!all && shown.length < measurements.length && (
          <button
            type="button"
            onClick={() => setAll(true)}
            className="min-h-11 w-full border-b hairline pl-12 text-left text-indigo underline underline-offset-4"
          >
            Show the other {measurements.length - shown.length} measurements
          </button>
        )}
      </CardTape>
      <TextField
        label="Notes"
        value={details.note}
        readOnly={readOnly}
        hint="Posture, what was worn, anything to remember."
        error={problem('note')}
        onChange={(event) => keep({ details: { ...details, note: event.target.value } })}
      />
    </div>
  )
}

function draftAddress({ id, clientId }: OpenCard): string {
  return `/drafts/new?card=${id}${clientId ? `&client=${clientId}` : ''}`
}

function tone(state: CardSaving): string {
  if (state.kind === 'saved') return 'text-fern'
  return state.kind === 'offline' || state.kind === 'refused' ? 'text-weld' : 'text-walnut'
}

function UnitChoice({ unit, onUnit }: { readonly unit: Unit; readonly onUnit: (unit: Unit) => void }) {
  return (
    <fieldset className="grid gap-1">
      <legend className="mb-1 text-sm font-semibold">Unit</legend>
      <div className="flex rounded border border-rule bg-sheet">
        {(['in', 'cm'] as const).map((each) => (
          <button
            key={each}
            type="button"
            aria-pressed={unit === each}
            onClick={() => onUnit(each)}
            className={classes(
              'min-h-9.5 rounded px-4',
              unit === each ? 'bg-panel font-semibold' : 'text-walnut',
            )}
          >
            {each === 'in' ? 'inches' : 'cm'}
          </button>
        ))}
      </div>
    </fieldset>
  )
}

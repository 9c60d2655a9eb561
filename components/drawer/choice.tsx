'use client'

import { offeredChoices, type DesignValue } from '@/drafting'
import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import type { FieldRef } from '@/components/studio/field-ref'
import { problemsAt } from '@/components/studio/store'
import { useStudio, useStudioList, useStudioState } from '@/components/studio/use-store'
import { ValueField } from '@/components/studio/value-field'
import { currentValue } from '@/components/studio/values'
import { PictureChoice } from './picture-choice'
import { useChoicePictures } from './use-choice-pictures'
import { wordsOf } from './words-of'

/** One style value: a box to tick, a choice among a few, or a measurement to type. */
export function Choice({ value }: { readonly value: DesignValue }) {
  if (value.kind === 'yes-no') return <YesNo value={value} />
  if (value.kind === 'choice') return <OneOf value={value} />
  return <ValueField field={`design.${value.id}`} label={value.name} />
}

function useValue(value: DesignValue) {
  const { store, garment, writable } = useStudio()
  const ref: FieldRef = `design.${value.id}`
  const now = useStudioState((state) => state.attempts[ref]?.value ?? currentValue(garment, state.order, ref))
  const problem = useStudioState((state) => problemsAt(state, ref)[0]?.message)
  const change = (next: string | boolean) => store.change(ref, next, value.name)
  return { now, problem, change, disabled: !writable }
}

function YesNo({ value }: { readonly value: DesignValue }) {
  const { now, problem, change, disabled } = useValue(value)
  return (
    <div>
      <Checkbox
        label={value.name}
        checked={now === true}
        disabled={disabled}
        onChange={(event) => change(event.target.checked)}
      />
      {problem && <p className="text-sm text-madder">{problem}</p>}
    </div>
  )
}

function OneOf({ value }: { readonly value: DesignValue }) {
  const { now, problem, change, disabled } = useValue(value)
  const pictures = useChoicePictures(value)
  const { garment } = useStudio()
  const offered = useStudioList((state) =>
    offeredChoices(garment.id, value, (id) => currentValue(garment, state.order, `design.${id}`)),
  )
  const choices = (value.choices ?? [])
    .filter((choice) => offered.includes(choice) || choice === now)
    .map((choice) => ({ value: choice, label: wordsOf(choice) }))
  if (pictures) {
    return (
      <PictureChoice
        label={value.name}
        value={String(now)}
        choices={choices.map((choice) => ({ ...choice, picture: pictures.get(choice.value) }))}
        disabled={disabled}
        error={problem}
        onChange={change}
      />
    )
  }
  return (
    <Select
      label={value.name}
      value={String(now)}
      disabled={disabled}
      error={problem}
      onChange={(event) => change(event.target.value)}
      choices={choices}
    />
  )
}

'use client'

import { isOffered, type DesignValue } from '@/drafting'
import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import type { FieldRef } from '@/components/studio/field-ref'
import { problemsAt } from '@/components/studio/store'
import { useStudio, useStudioList, useStudioState } from '@/components/studio/use-store'
import { ValueField } from '@/components/studio/value-field'
import { currentValue } from '@/components/studio/values'

/** 'centre-back' → 'Centre back'. */
export function wordsOf(id: string): string {
  const words = id.replaceAll('-', ' ')
  return words.charAt(0).toUpperCase() + words.slice(1)
}

/** The style: what was chosen about the garment, by its parts. What a choice rules out is not shown. */
export function Choices() {
  const { garment } = useStudio()
  const offered = useStudioList((state) =>
    garment.design.filter((value) =>
      isOffered(value, (id) => currentValue(garment, state.order, `design.${id}`)),
    ),
  )
  const parts = [...new Set(offered.map((value) => value.part))]
  return (
    <div className="grid gap-7 p-4">
      {parts.map((part) => (
        <fieldset key={part} className="grid gap-4">
          <legend className="tape-edge mb-3 w-full pb-2.5 font-semibold">{wordsOf(part)}</legend>
          {offered
            .filter((value) => value.part === part)
            .map((value) => (
              <Choice key={value.id} value={value} />
            ))}
        </fieldset>
      ))}
    </div>
  )
}

function Choice({ value }: { readonly value: DesignValue }) {
  const { store, garment, writable } = useStudio()
  const ref: FieldRef = `design.${value.id}`
  const now = useStudioState((state) => state.attempts[ref]?.value ?? currentValue(garment, state.order, ref))
  const problem = useStudioState((state) => problemsAt(state, ref)[0]?.message)
  if (value.kind === 'yes-no') {
    return (
      <div>
        <Checkbox
          label={value.name}
          checked={now === true}
          disabled={!writable}
          onChange={(event) => store.change(ref, event.target.checked, value.name)}
        />
        {problem && <p className="text-sm text-madder">{problem}</p>}
      </div>
    )
  }
  if (value.kind === 'choice') {
    return (
      <Select
        label={value.name}
        value={String(now)}
        disabled={!writable}
        error={problem}
        onChange={(event) => store.change(ref, event.target.value, value.name)}
        choices={(value.choices ?? []).map((choice) => ({ value: choice, label: wordsOf(choice) }))}
      />
    )
  }
  return <ValueField field={ref} label={value.name} />
}

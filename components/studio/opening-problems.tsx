'use client'

import type { MeasurementDefinition } from '@/drafting/contract'
import { ErrorNote } from '@/components/ui/error-note'
import { useStudio, useStudioState } from './use-store'
import { ValueField } from './value-field'
import type { FieldRef } from './field-ref'

interface Wanted {
  readonly ref: FieldRef
  readonly label: string
  readonly hint: string | undefined
}

/** Where nothing can be drawn yet: every reason, with the field that puts it right beside it. */
export function OpeningProblems({ definitions }: { readonly definitions: readonly MeasurementDefinition[] }) {
  const { garment } = useStudio()
  const problems = useStudioState((state) => (state.draft ? undefined : state.problems))
  if (!problems) return null

  const fields: readonly Wanted[] = [...new Set(problems.map((problem) => problem.field))].flatMap(
    (field): readonly Wanted[] => {
      const id = field.slice(field.indexOf('.') + 1)
      const measurement = definitions.find((each) => each.id === id)
      if (measurement)
        return [{ ref: `measurements.${id}` as FieldRef, label: measurement.name, hint: measurement.how }]
      const value = garment.design.find((each) => each.id === id)
      return value ? [{ ref: `design.${id}` as FieldRef, label: value.name, hint: undefined }] : []
    },
  )

  return (
    <div className="absolute inset-0 overflow-y-auto bg-ground p-6">
      <div className="mx-auto grid max-w-110 gap-4">
        <h2 className="text-xl font-semibold">Before this can be drawn</h2>
        {fields.map(({ ref, label, hint }) => (
          <ValueField key={ref} field={ref} label={label} hint={hint} />
        ))}
        {fields.length === 0 && <ErrorNote>{problems.map((problem) => problem.message).join(' ')}</ErrorNote>}
      </div>
    </div>
  )
}

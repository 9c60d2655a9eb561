'use client'

import { FieldFrame, controlClass } from '@/components/ui/field'
import { classes } from '@/components/ui/classes'
import type { FieldRef } from './field-ref'
import { useField } from './use-field'

/** One number of the order as a labelled field; the pattern redraws while it is typed. */
export function ValueField({
  field: ref,
  label,
  hint,
  onFocus,
}: {
  readonly field: FieldRef
  readonly label: string
  readonly hint?: string
  readonly onFocus?: () => void
}) {
  const field = useField(ref, label)
  return (
    <FieldFrame label={label} hint={hint} error={field.problem || undefined}>
      {(control) => (
        <div className="flex items-center gap-2">
          <input
            {...control}
            {...field.input}
            onFocus={(event) => {
              field.input.onFocus(event)
              onFocus?.()
            }}
            className={classes(controlClass, 'measure max-w-36')}
          />
          <span className="text-sm text-walnut">{field.unit}</span>
          {field.refused && (
            <button
              type="button"
              onPointerDown={(event) => event.preventDefault()}
              onClick={field.putBack}
              className="min-h-8 text-sm font-semibold text-indigo underline underline-offset-2"
            >
              Put back
            </button>
          )}
        </div>
      )}
    </FieldFrame>
  )
}

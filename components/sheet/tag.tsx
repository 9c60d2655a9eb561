'use client'

import { memo } from 'react'
import { classes } from '@/components/ui/classes'
import { typesetFractions } from '@/drafting/drawing/typeset'
import type { FieldRef } from '@/components/studio/field-ref'
import { useField } from '@/components/studio/use-field'
import { useStudioState } from '@/components/studio/use-store'
import { lengthInWords } from '@/components/studio/lengths-in-words'
import { formatLength } from '@/drafting/lengths'

const shape =
  'group absolute top-0 left-0 text-tag pointer-events-auto data-folded:z-0 z-10 focus-within:z-30 hover:z-20'

/** A tag without room for its figures: a dot in the least room that a pointer can take. */
const folded =
  'group-data-folded:not-focus:size-6 group-data-folded:not-focus:min-w-0 group-data-folded:not-focus:rounded-full ' +
  'group-data-folded:not-focus:border-transparent group-data-folded:not-focus:bg-indigo group-data-folded:not-focus:bg-clip-content ' +
  'group-data-folded:not-focus:p-[7px] group-data-folded:not-focus:text-[0px]'

/** Words that open over a tag: centred on it, or inwards where the window ends. */
const words =
  'absolute left-1/2 z-40 -translate-x-1/2 group-data-[edge=left]:left-0 group-data-[edge=left]:translate-x-0 ' +
  'group-data-[edge=right]:right-0 group-data-[edge=right]:left-auto group-data-[edge=right]:translate-x-0'

/** A length that follows from others, written where a drafter would write it. */
export const ResultTag = memo(function ResultTag({
  id,
  label,
}: {
  readonly id: string
  readonly label: string
}) {
  const length = useStudioState(
    (state) => state.draft?.dimensions.find((dimension) => dimension.id === id)?.length ?? 0,
  )
  const unit = useStudioState((state) => state.unit)
  return (
    <li data-tag={id} className={classes(shape, 'text-walnut')} title={label}>
      <span aria-hidden className="measure block bg-sheet/85 px-1.5 py-0.5 group-data-folded:hidden">
        {typesetFractions(formatLength(length, unit))}
      </span>
      <span
        aria-hidden
        className="m-2 hidden size-2 rounded-full bg-rule group-data-folded:block group-hover:hidden"
      />
      <span aria-hidden className="measure hidden bg-sheet px-1.5 py-0.5 group-data-folded:group-hover:block">
        {label} {typesetFractions(formatLength(length, unit))}
      </span>
      <span className="sr-only">{`${label} ${lengthInWords(length, unit)}`}</span>
    </li>
  )
})

/** A style measurement on the line it rules: type, and the pattern redraws. */
export const ValueTag = memo(function ValueTag({
  dimension,
  label,
  field: ref,
  onOpen,
}: {
  /** Id of the dimension that it stands for. */
  readonly dimension: string
  readonly label: string
  readonly field: FieldRef
  /** On a phone the tag is a button that opens its editor above the keyboard. */
  readonly onOpen?: (dimension: string) => void
}) {
  const over = useStudioState(
    (state) => state.draft?.dimensions.find((each) => each.id === dimension)?.over ?? 0,
  )
  const field = useField(ref, label, over)
  const id = `tag-${dimension}`
  const frame = classes(
    'rounded border bg-sheet text-ink',
    field.problem ? 'border-madder border-2' : 'border-rule group-hover:border-indigo',
  )
  return (
    <li data-tag={dimension} className={shape} title={label}>
      {onOpen ? (
        <button
          type="button"
          onClick={() => onOpen(dimension)}
          aria-label={`${label}, ${field.input.value} ${field.unit}`}
          className={classes(
            frame,
            'measure min-h-6 min-w-6 px-1.5 group-data-folded:rounded-full group-data-folded:px-0',
          )}
        >
          <span className="group-data-folded:hidden">{typesetFractions(field.input.value)}</span>
          <span
            aria-hidden
            className="mx-auto hidden size-2 rounded-full bg-indigo group-data-folded:block"
          />
        </button>
      ) : (
        <input
          {...field.input}
          id={id}
          size={Math.max(3, field.input.value.length + 1)}
          aria-label={`${label}${field.unit ? `, ${field.unit}` : ''}`}
          aria-describedby={field.problem ? `${id}-problem` : undefined}
          className={classes(
            frame,
            'measure min-h-6 min-w-10 px-2 text-center leading-5 [field-sizing:content] focus:border-indigo',
            folded,
          )}
        />
      )}
      <span
        aria-hidden
        className={classes(
          words,
          'pointer-events-none bottom-full hidden bg-ink px-1.5 py-px text-tag whitespace-nowrap text-ground group-focus-within:block group-hover:block',
        )}
      >
        {label}
      </span>
      {field.problem && (
        <p
          id={`${id}-problem`}
          className={classes(
            words,
            'top-full mt-1 hidden w-60 border-l-3 border-madder bg-sheet px-2.5 py-1.5 text-sm text-ink shadow-float group-focus-within:block group-hover:block',
          )}
        >
          {field.problem}{' '}
          {field.refused && (
            <button
              type="button"
              onPointerDown={(event) => event.preventDefault()}
              onClick={field.putBack}
              className="min-h-6 font-semibold text-indigo underline underline-offset-2"
            >
              Put back
            </button>
          )}
        </p>
      )}
    </li>
  )
})

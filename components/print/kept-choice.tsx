'use client'

import type { Difference } from '@/drafting/compare/differences'
import type { Draft } from '@/drafting/contract'
import { formatLength } from '@/drafting/lengths'
import { Note } from '@/components/ui/error-note'
import { Moment } from '@/components/ui/moment'
import type { PrintChoices } from './print-choices'

/** What was printed or shared, when it is drawn otherwise today. */
export interface Otherwise {
  readonly keptAt: string
  readonly kept: Draft
  readonly differences: readonly Difference[]
  readonly drawable: boolean
}

/** Places that are named before the rest is counted. */
const named = 4

/** 'Front: side, cutting line (1.2 mm)' */
export function placeWords({ piece, where, by }: Difference): string {
  if (by === null) return `${piece}: ${where}`
  return `${piece}: ${where} (${by < 1 ? `${by.toFixed(2)} mm` : formatLength(by, 'cm')})`
}

/** Says that a version was printed or shared before and is drawn otherwise today, where, and lets the person choose. */
export function KeptChoice({
  otherwise,
  drawing,
  onChange,
}: {
  readonly otherwise: Otherwise
  readonly drawing: PrintChoices['drawing']
  readonly onChange: (drawing: PrintChoices['drawing']) => void
}) {
  const { keptAt, differences, drawable } = otherwise
  const rest = differences.length - named
  return (
    <Note kind="caution" className="mb-5">
      <p>
        This version was printed or shared on <Moment at={keptAt} />.{' '}
        {drawable
          ? 'Chalkfold draws it a little otherwise today:'
          : 'Chalkfold would refuse to draw it today, so it is printed as it was.'}
      </p>
      {drawable && (
        <>
          <ul className="my-2 list-disc pl-5 text-sm">
            {differences.slice(0, named).map((each) => (
              <li key={`${each.piece}/${each.where}`}>{placeWords(each)}</li>
            ))}
            {rest > 0 && <li>and in {rest} more places</li>}
          </ul>
          <fieldset className="flex flex-wrap gap-x-6 gap-y-1">
            <legend className="sr-only">Which drawing</legend>
            {(
              [
                ['kept', 'As it was'],
                ['today', 'As it is drawn today'],
              ] as const
            ).map(([value, label]) => (
              <label key={value} className="flex min-h-8 items-center gap-2 font-semibold">
                <input
                  type="radio"
                  name="drawing"
                  checked={drawing === value}
                  onChange={() => onChange(value)}
                  className="size-4 accent-(--indigo)"
                />
                {label}
              </label>
            ))}
          </fieldset>
        </>
      )}
    </Note>
  )
}

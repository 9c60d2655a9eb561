'use client'

import { TriangleAlert } from 'lucide-react'
import { useId, type ReactNode } from 'react'
import { classes } from '@/components/ui/classes'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { typesetTyped } from '@/components/ui/typed-fractions'
import { Figure } from './figure'

/** One measurement as it hangs on the tape. */
export interface TapeRow {
  readonly id: string
  readonly name: string
  readonly how: string
  readonly text: string
  readonly error?: string
  /** Why it is odd against the others. */
  readonly caution?: string
  /** '≈ 14 1/4 in, neck base from bust': what a draft would go by until it is measured. */
  readonly estimate?: string
}

/** The tape of a measure card: a figure that shows where, a drawn tape, and every measurement at its place from head to floor. */
export function CardTape({
  rows,
  unit,
  focused,
  onFocus,
  onType,
  onLeave,
  readOnly,
  children,
}: {
  readonly rows: readonly TapeRow[]
  readonly unit: 'in' | 'cm'
  readonly focused: string | undefined
  readonly onFocus: (id: string) => void
  readonly onType: (id: string, text: string) => void
  readonly onLeave: (id: string) => void
  readonly readOnly: boolean
  /** What stands under the last measurement. */
  readonly children?: ReactNode
}) {
  const row = rows.find((each) => each.id === focused)
  return (
    <div className="grid gap-x-0 md:grid-cols-[19rem_1fr]">
      <div className="sticky top-0 z-10 -mx-4 flex items-center gap-4 border-b border-rule bg-panel px-4 py-2 sm:-mx-8 sm:px-8 md:mx-0 md:h-[min(44rem,100dvh)] md:flex-col md:items-start md:border-b-0 md:bg-transparent md:px-0 md:py-4">
        <Figure focused={focused} className="h-28 shrink-0 md:h-auto md:min-h-0 md:flex-1" />
        <p className="text-sm text-walnut md:min-h-28 md:max-w-64" aria-hidden>
          {row ? (
            <>
              <span className="block font-semibold text-ink">{row.name}</span>
              {row.how}
            </>
          ) : (
            'Choose a measurement to see where it is taken.'
          )}
        </p>
      </div>
      <div className="border-rule bg-sheet md:border-l">
        <ol>
          {rows.map((each, index) => (
            <Row
              key={each.id}
              row={each}
              index={index}
              unit={unit}
              readOnly={readOnly}
              here={each.id === focused}
              onFocus={() => onFocus(each.id)}
              onType={(text) => onType(each.id, text)}
              onLeave={() => onLeave(each.id)}
            />
          ))}
        </ol>
        {children}
      </div>
    </div>
  )
}

function Row({
  row,
  index,
  unit,
  here,
  readOnly,
  onFocus,
  onType,
  onLeave,
}: {
  readonly row: TapeRow
  readonly index: number
  readonly unit: 'in' | 'cm'
  readonly here: boolean
  readonly readOnly: boolean
  readonly onFocus: () => void
  readonly onType: (text: string) => void
  readonly onLeave: () => void
}) {
  const id = useId()
  return (
    <li
      className={classes(
        'relative grid grid-cols-[1fr_auto] items-center gap-x-4 border-b hairline py-2 pr-3 pl-12',
        here && 'bg-panel',
      )}
    >
      <Ticks index={index} here={here} />
      <label htmlFor={id} className="py-1">
        {row.name}
      </label>
      <div className="flex items-center gap-2">
        <input
          id={id}
          value={typesetTyped(row.text)}
          readOnly={readOnly}
          inputMode="text"
          autoComplete="off"
          spellCheck={false}
          enterKeyHint="next"
          placeholder={row.estimate ? '≈' : ''}
          aria-invalid={row.error ? true : undefined}
          aria-describedby={`${id}-how`}
          onFocus={(event) => {
            event.currentTarget.select()
            onFocus()
          }}
          onChange={(event) => onType(event.currentTarget.value)}
          onBlur={onLeave}
          onKeyDown={(event) => {
            if (event.key === 'Enter') next(event.currentTarget)
          }}
          className="measure min-h-11 w-28 rounded border border-rule bg-ground px-3 text-right text-lg aria-invalid:border-2 aria-invalid:border-madder"
        />
        <span className="w-6 text-sm text-walnut">{unit}</span>
      </div>
      <div id={`${id}-how`} className="col-span-2 grid gap-1 text-sm">
        <span className="sr-only">{row.how}</span>
        {row.error && <p className="text-madder">{row.error}</p>}
        {row.caution && (
          <p className="flex gap-1.5 text-weld">
            <TriangleAlert size={16} aria-hidden className="mt-0.5 shrink-0" />
            <span className="max-w-120">{typesetFractions(row.caution)}</span>
          </p>
        )}
        {row.estimate && !row.text && <p className="measure text-walnut">{typesetFractions(row.estimate)}</p>}
      </div>
    </li>
  )
}

/** Enter goes on to the next measurement, as the hand goes on down the body. */
function next(input: HTMLInputElement) {
  const all = [...(input.closest('ol')?.querySelectorAll('input') ?? [])]
  all[all.indexOf(input) + 1]?.focus()
}

/** The edge of the tape beside a row, numbered like one. */
function Ticks({ index, here }: { readonly index: number; readonly here: boolean }) {
  return (
    <span aria-hidden className="absolute inset-y-0 left-0 w-9 overflow-hidden bg-panel text-walnut">
      <svg width="100%" height="100%" className="block" stroke="currentColor">
        {Array.from({ length: 24 }, (_, tick) => (
          <path
            key={tick}
            d={`M0 ${tick * 8 + 0.5}h${tick === 0 ? 16 : tick % 4 === 0 ? 10 : 5}`}
            opacity="0.55"
          />
        ))}
      </svg>
      <span className={classes('absolute top-3 right-1.5 text-tag', here && 'font-semibold text-indigo')}>
        {index + 1}
      </span>
    </span>
  )
}

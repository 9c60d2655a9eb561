'use client'

import { PanelLeftClose, Ruler } from 'lucide-react'
import { useState } from 'react'
import type { MeasurementDefinition } from '@/drafting/contract'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { ValueField } from '@/components/studio/value-field'
import { useStudio, useStudioState } from '@/components/studio/use-store'
import { shownText } from '@/components/studio/values'
import { estimates } from '@/drafting/body'
import { lengthDigits } from '@/drafting/lengths'
import { Figure } from './figure'
import { TapeStrip } from './tape-strip'

/** 'head-from-height' → 'Estimated: head from height'. */
function estimateName(id: string): string {
  const name = Object.values(estimates).find((each) => each.id === id)?.name ?? id
  return `Estimated: ${name.charAt(0).toLowerCase()}${name.slice(1)}`
}

/** The measurements this draft is made from, in the order of the body. */
function useDraftMeasurements(definitions: readonly MeasurementDefinition[]): readonly string[] {
  const { garment } = useStudio()
  const given = useStudioState((state) => state.order.measurements)
  const wanted = new Set([...garment.needs, ...garment.estimates, ...Object.keys(given)])
  return definitions.map((definition) => definition.id).filter((id) => wanted.has(id))
}

/** The tape folded in: every measurement hangs at its height with its figure. */
function TapeRail({
  definitions,
  onOpen,
}: {
  readonly definitions: readonly MeasurementDefinition[]
  readonly onOpen: (id: string | undefined) => void
}) {
  const ids = useDraftMeasurements(definitions)
  return (
    <nav
      aria-label="Body measurements"
      className="relative flex w-18 shrink-0 flex-col border-r border-rule bg-panel"
    >
      <button
        type="button"
        onClick={() => onOpen(undefined)}
        className="flex min-h-11 items-center justify-center gap-1 border-b hairline text-sm font-semibold hover:text-indigo"
      >
        <Ruler size={16} aria-hidden />
        Tape
      </button>
      <TapeStrip className="pointer-events-none absolute top-11 right-0 bottom-0 w-5 rotate-180" />
      <ol className="min-h-0 flex-1 overflow-y-auto py-1 [scrollbar-width:none]">
        {ids.map((id) => (
          <RailEntry
            key={id}
            id={id}
            name={definitions.find((definition) => definition.id === id)?.name ?? id}
            onOpen={() => onOpen(id)}
          />
        ))}
      </ol>
    </nav>
  )
}

function RailEntry({
  id,
  name,
  onOpen,
}: {
  readonly id: string
  readonly name: string
  readonly onOpen: () => void
}) {
  const unit = useStudioState((state) => state.unit)
  const given = useStudioState((state) => state.order.measurements[id])
  const typed = useStudioState((state) => state.typed[`measurements.${id}`])
  const estimate = useStudioState((state) => state.resting?.used[id]?.mm)
  const estimated = estimate === undefined ? '' : `≈ ${lengthDigits(estimate, unit)}`
  const text = given === undefined ? estimated : shownText('length', given, typed, unit)
  return (
    <li>
      <button
        type="button"
        onClick={onOpen}
        className="relative block min-h-11 w-full px-1.5 py-0.5 text-left hover:text-indigo"
      >
        <span className="measure block font-semibold">{text ? typesetFractions(text) : '–'}</span>
        <span className="line-clamp-2 block pr-3 text-[12px] leading-3.5 text-walnut">{name}</span>
      </button>
    </li>
  )
}

/** The tape drawn out: figure, how each is taken, and the fields. Changes here stay with this draft. */
export function TapePanel({
  definitions,
  focused,
  onClose,
}: {
  readonly definitions: readonly MeasurementDefinition[]
  readonly focused: string | undefined
  readonly onClose?: () => void
}) {
  const ids = useDraftMeasurements(definitions)
  const [at, setAt] = useState(focused)
  const definition = definitions.find((each) => each.id === at)
  const used = useStudioState((state) => state.resting?.used)
  return (
    <section aria-label="Body measurements" className="flex min-h-0 flex-1 flex-col bg-panel">
      {onClose && (
        <header className="flex min-h-11 items-center justify-between gap-2 border-b hairline px-4">
          <h2 className="font-semibold">Tape</h2>
          <button
            type="button"
            onClick={onClose}
            className="flex min-h-11 items-center gap-1.5 text-sm text-walnut hover:text-ink"
          >
            <PanelLeftClose size={16} aria-hidden />
            Fold in
          </button>
        </header>
      )}
      <div className="flex items-center gap-3 border-b hairline px-4 py-2">
        <Figure focused={at} className="h-40 shrink-0" />
        <p className="text-sm text-walnut">
          {definition ? definition.how : 'Choose a measurement to see where it is taken.'}
        </p>
      </div>
      <div className="relative min-h-0 flex-1 overflow-y-auto py-4 pr-4 pl-8">
        <TapeStrip className="pointer-events-none absolute top-0 left-0 h-full w-6" />
        <p className="mb-4 text-sm text-walnut">
          Changed here, changed for this draft. The measure card stays as it is.
        </p>
        <div className="grid gap-4">
          {ids.map((id) => {
            const estimate = used?.[id]?.estimatedBy
            return (
              <ValueField
                key={id}
                field={`measurements.${id}`}
                label={definitions.find((each) => each.id === id)?.name ?? id}
                hint={estimate ? `Not measured. ${estimateName(estimate)}.` : undefined}
                onFocus={() => setAt(id)}
              />
            )
          })}
        </div>
      </div>
    </section>
  )
}

/** The tape at the left of the studio: folded in, or drawn out to its fields. */
export function StudioTape({ definitions }: { readonly definitions: readonly MeasurementDefinition[] }) {
  const [open, setOpen] = useState<{ readonly at: string | undefined }>()
  if (!open) return <TapeRail definitions={definitions} onOpen={(at) => setOpen({ at })} />
  return (
    <div className="flex w-80 shrink-0 flex-col border-r border-rule">
      <TapePanel definitions={definitions} focused={open.at} onClose={() => setOpen(undefined)} />
    </div>
  )
}

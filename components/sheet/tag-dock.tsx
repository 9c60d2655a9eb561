'use client'

import { ChevronLeft, ChevronRight } from 'lucide-react'
import { useEffect, useRef, type PointerEvent, type ReactNode } from 'react'
import type { Dimension } from '@/drafting/contract'
import type { FieldRef } from '@/components/studio/field-ref'
import { useField } from '@/components/studio/use-field'
import { useStudioState } from '@/components/studio/use-store'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { plainText } from '@/components/ui/typed-fractions'
import { withFraction } from './with-fraction'

const eighths = ['0', '1/8', '1/4', '3/8', '1/2', '5/8', '3/4', '7/8'] as const

/** On a phone: the focused tag, docked above the keyboard, with keys for whole inches and eighths. */
export function TagDock({
  dimension,
  onNext,
  onDone,
}: {
  readonly dimension: Dimension
  readonly onNext: (step: 1 | -1) => void
  readonly onDone: () => void
}) {
  const { label, value, over } = dimension
  const ref: FieldRef = `design.${value ?? ''}`
  const field = useField(ref, label, over)
  const unit = useStudioState((state) => state.unit)
  const box = useRef<HTMLInputElement>(null)
  useEffect(() => box.current?.focus(), [ref])

  return (
    <div className="fixed inset-x-0 bottom-0 z-40 border-t border-rule bg-panel p-2 pb-[max(0.5rem,env(safe-area-inset-bottom))] shadow-float">
      <div className="flex items-center gap-2">
        <label htmlFor="dock" className="min-w-0 flex-1 truncate font-semibold">
          {label}
        </label>
        <input
          id="dock"
          ref={box}
          {...field.input}
          inputMode="decimal"
          onKeyDown={(event) => {
            if (event.key === 'Enter') onDone()
            else field.input.onKeyDown(event)
          }}
          aria-describedby={field.problem ? 'dock-problem' : undefined}
          className="measure min-h-11 w-28 rounded border border-rule bg-sheet px-3 text-center text-lg aria-invalid:border-2 aria-invalid:border-madder"
        />
        <span className="w-6 text-sm text-walnut">{field.unit}</span>
      </div>
      {field.problem && (
        <p id="dock-problem" className="pt-1 text-sm text-madder">
          {field.problem}
        </p>
      )}
      {field.kind === 'length' && unit === 'in' && (
        <div role="group" aria-label="Eighths" className="mt-2 grid grid-cols-8 gap-1">
          {eighths.map((part) => (
            <Key
              key={part}
              name={part}
              onPress={() => field.type(withFraction(plainText(field.input.value), part))}
            >
              {part === '0' ? '0' : typesetFractions(part)}
            </Key>
          ))}
        </div>
      )}
      <div className="mt-1 grid grid-cols-[auto_1fr_1fr_auto_auto] gap-1">
        <Key name="Measurement before" onPress={() => onNext(-1)}>
          <ChevronLeft size={20} aria-hidden />
        </Key>
        <Key name="Less" onPress={() => field.step(-1, true)}>
          {unit === 'in' ? '−1 in' : '−1 cm'}
        </Key>
        <Key name="More" onPress={() => field.step(1, true)}>
          {unit === 'in' ? '+1 in' : '+1 cm'}
        </Key>
        <Key name="Next measurement" onPress={() => onNext(1)}>
          <ChevronRight size={20} aria-hidden />
        </Key>
        <Key name="Done" onPress={onDone}>
          Done
        </Key>
      </div>
    </div>
  )
}

/** A key that leaves the focus, and so the keyboard, where it is. */
function Key({ name, onPress, children }: { name: string; onPress: () => void; children: ReactNode }) {
  return (
    <button
      type="button"
      aria-label={name}
      onPointerDown={(event: PointerEvent) => event.preventDefault()}
      onClick={onPress}
      className="grid min-h-11 min-w-11 place-items-center rounded border hairline bg-sheet px-2 font-semibold active:bg-indigo active:text-ground"
    >
      {children}
    </button>
  )
}

'use client'

import { useRef, type KeyboardEvent, type PointerEvent } from 'react'
import type { Step } from '@/drafting/contract'
import { typesetFractions } from '@/drafting/drawing/typeset'
import { plainText } from '@/components/ui/typed-fractions'

/** The sentence of a step: what is done, then the sum behind it. */
export function stepWords(step: Step): string {
  return step.arithmetic ? `${step.text}: ${step.arithmetic}` : step.text
}

/**
 * The ribbon: a tape laid flat, one tick a step. Drag along it, or use the arrow keys, to watch the pattern being drafted; its far end is the
 * finished pattern.
 */
export function Ribbon({
  steps,
  at,
  onMove,
}: {
  readonly steps: readonly Step[]
  /** Index of the step last drawn; undefined: the finished pattern. */
  readonly at: number | undefined
  readonly onMove: (at: number | undefined) => void
}) {
  const track = useRef<HTMLDivElement>(null)
  const end = steps.length
  const now = at ?? end
  const step = at === undefined ? undefined : steps[at]
  const words = step ? `${now + 1} of ${end}. ${stepWords(step)}` : `Finished pattern, ${end} steps`

  const move = (to: number) => {
    const within = Math.max(0, Math.min(end, to))
    onMove(within >= end ? undefined : within)
  }

  function follow(event: PointerEvent<HTMLDivElement>) {
    const box = track.current?.getBoundingClientRect()
    if (!box || end === 0) return
    move(Math.round(((event.clientX - box.left) / box.width) * end))
  }

  function key(event: KeyboardEvent<HTMLDivElement>) {
    const to = {
      ArrowRight: now + 1,
      ArrowUp: now + 1,
      ArrowLeft: now - 1,
      ArrowDown: now - 1,
      PageUp: now + 10,
      PageDown: now - 10,
      Home: 0,
      End: end,
    }[event.key]
    if (to === undefined) return
    event.preventDefault()
    move(to)
  }

  const share = end === 0 ? 1 : now / end
  return (
    <section
      aria-label="Ribbon"
      className="flex min-h-14 shrink-0 items-stretch gap-3 border-t border-rule bg-ground px-3"
    >
      <div
        role="slider"
        tabIndex={0}
        aria-label="Steps of the draft"
        aria-valuemin={0}
        aria-valuemax={end}
        aria-valuenow={now}
        aria-valuetext={plainText(words)}
        onKeyDown={key}
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture(event.pointerId)
          follow(event)
        }}
        onPointerMove={(event) => {
          if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event)
        }}
        className="relative min-w-0 flex-1 cursor-ew-resize touch-none"
      >
        <p className="pt-1 pb-8 text-sm sm:absolute sm:inset-x-0 sm:top-0 sm:truncate sm:pb-0" aria-hidden>
          {step ? (
            <>
              <span className="font-semibold">{now + 1}</span> {typesetFractions(stepWords(step))}
            </>
          ) : (
            <span className="text-walnut">
              Drag along the ribbon to watch the pattern being drafted, step by step
            </span>
          )}
        </p>
        <div ref={track} className="absolute inset-x-2 bottom-2 h-5 border-b border-rule">
          {steps.map((each, index) => (
            <span
              key={each.id}
              style={{ left: `${(index / Math.max(1, end)) * 100}%` }}
              className={tickClass(index, now)}
            />
          ))}
          <span
            style={{ left: `${share * 100}%` }}
            className="absolute -bottom-1.5 size-3 -translate-x-1/2 rounded-full border-2 border-indigo bg-ground"
          />
        </div>
      </div>
      {at !== undefined && (
        <button
          type="button"
          onClick={() => onMove(undefined)}
          className="my-1.5 shrink-0 rounded border border-rule px-3 text-sm font-semibold hover:border-indigo hover:text-indigo"
        >
          Finished pattern
        </button>
      )}
    </section>
  )
}

function tickClass(index: number, now: number): string {
  const height = index % 10 === 0 ? 'h-4' : index % 5 === 0 ? 'h-3' : 'h-2'
  return `absolute bottom-0 w-px ${height} ${index <= now ? 'bg-ink' : 'bg-rule'}`
}

'use client'

import { useEffect, useMemo, useRef, useState, type KeyboardEvent } from 'react'
import type { Handle, MeasurementDefinition, Point } from '@/drafting/contract'
import { placeTransform, type Places } from '@/drafting/drawing'
import { applyTo } from '@/drafting/geometry/transform'
import { classes } from '@/components/ui/classes'
import { useStudio, useStudioState } from '@/components/studio/use-store'
import { markAt } from './drag-point'
import { toScreen, type View } from './view'
import { fixedPoints, type FixedPoint } from './why-fixed'

/** px: so near to a mark the pointer means it. */
const reach = 11
/** px: half of the room that the words take; nearer to the window's edge they open inwards. */
const halfWords = 140

interface Shown {
  readonly id: string
  readonly at: Point
  /** Towards which side the words open. */
  readonly opens: 'left' | 'right' | 'both'
}

/**
 * Marks that stay where the draft puts them. Pointed at, tapped or reached by keyboard, each says how it came about, why it cannot be dragged,
 * and what does move it.
 */
export function FixedPoints({
  handles,
  hidden,
  definitions,
  places,
  view,
}: {
  readonly handles: readonly Handle[]
  /** Pieces that are put aside. */
  readonly hidden: ReadonlySet<string>
  readonly definitions: readonly MeasurementDefinition[]
  readonly places: () => Places
  readonly view: () => View
}) {
  const { store, garment } = useStudio()
  const draft = useStudioState((state) => state.resting)
  const list = useRef<HTMLUListElement>(null)
  const [shown, setShown] = useState<Shown>()
  const [stop, setStop] = useState(0)

  const points = useMemo(() => {
    const names = new Map(definitions.map(({ id, name }) => [id, name]))
    const all = draft ? fixedPoints(draft, handles, garment, names) : []
    return all.filter(({ piece }) => !hidden.has(piece))
  }, [definitions, draft, garment, handles, hidden])

  useEffect(() => {
    const area = list.current?.closest<HTMLElement>('[data-sheet]')
    if (!area) return
    const off = new AbortController()

    const placeOf = ({ piece, mark }: FixedPoint): Point | undefined => {
      const { draft: now } = store.get()
      const at = now && markAt(now, piece, mark)
      return at && toScreen(view(), applyTo(placeTransform(places()[piece]), at))
    }
    const shownAt = ({ id }: FixedPoint, at: Point): Shown => {
      const opens = at.x < halfWords ? 'right' : at.x > area.clientWidth - halfWords ? 'left' : 'both'
      return { id, at, opens }
    }
    const near = (event: PointerEvent): Shown | undefined => {
      if (event.target instanceof Element && event.target.closest('input, button, [data-tag]'))
        return undefined
      const box = area.getBoundingClientRect()
      const pointer = { x: event.clientX - box.left, y: event.clientY - box.top }
      for (const point of points) {
        const at = placeOf(point)
        if (at && Math.hypot(at.x - pointer.x, at.y - pointer.y) < reach) return shownAt(point, at)
      }
      return undefined
    }
    const show = (next: Shown | undefined) => setShown((before) => (before?.id === next?.id ? before : next))

    const options = { signal: off.signal }
    const move = (event: PointerEvent) => {
      if (event.buttons === 0 && event.pointerType === 'mouse') show(near(event))
    }
    area.addEventListener('pointermove', move, options)
    area.addEventListener('pointerup', (event) => show(near(event)), options)
    area.addEventListener('pointerdown', () => setShown(undefined), options)
    area.addEventListener('wheel', () => setShown(undefined), { ...options, passive: true })
    area.addEventListener('pointerleave', () => setShown(undefined), options)
    area.addEventListener(
      'focusin',
      (event) => {
        const id = event.target instanceof HTMLElement ? event.target.dataset.fixed : undefined
        const point = points.find((each) => each.id === id)
        const at = point && placeOf(point)
        setShown(point && at ? shownAt(point, at) : undefined)
      },
      options,
    )
    return () => off.abort()
  }, [places, points, store, view])

  function key(event: KeyboardEvent<HTMLUListElement>) {
    const by = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 }[event.key]
    if (!by || points.length === 0) return
    event.preventDefault()
    const next = (Math.min(stop, points.length - 1) + by + points.length) % points.length
    setStop(next)
    list.current?.querySelectorAll('button')[next]?.focus()
  }

  const point = points.find(({ id }) => id === shown?.id)
  return (
    <>
      <ul
        ref={list}
        aria-label="Points that cannot be dragged. The arrow keys go from one to the next."
        className="sr-only"
        onKeyDown={key}
      >
        {points.map(({ id, name, why }, index) => (
          <li key={id}>
            <button
              type="button"
              data-fixed={id}
              tabIndex={index === Math.min(stop, points.length - 1) ? 0 : -1}
              onFocus={() => setStop(index)}
              onBlur={() => setShown(undefined)}
            >
              {name}. {why}
            </button>
          </li>
        ))}
      </ul>
      {shown && point && (
        <div
          aria-hidden
          className="pointer-events-none absolute top-0 left-0 z-40"
          style={{ transform: `translate(${Math.round(shown.at.x)}px, ${Math.round(shown.at.y)}px)` }}
        >
          <span className="absolute size-3 -translate-1/2 rotate-45 border-2 border-walnut bg-sheet" />
          <div
            className={classes(
              'absolute top-4 w-70 bg-ink px-2.5 py-1.5 text-sm text-ground shadow-float',
              { right: 'left-0', left: 'right-0', both: '-translate-x-1/2' }[shown.opens],
            )}
          >
            <span className="font-semibold">{point.name}.</span> {point.why}
          </div>
        </div>
      )}
    </>
  )
}

'use client'

import { useRef, type KeyboardEvent, type PointerEvent } from 'react'
import type { Handle, Point } from '@/drafting/contract'
import { placeTransform, type Places } from '@/drafting/drawing'
import { applyTo } from '@/drafting/geometry/transform'
import { lengthInWords } from '@/components/studio/lengths-in-words'
import { useStudio } from '@/components/studio/use-store'
import {
  currentValue,
  formatValue,
  kindOf,
  nudged,
  typedWithUnit,
  unitWord,
} from '@/components/studio/values'
import type { FieldRef } from '@/components/studio/field-ref'
import { byPiece } from './by-piece'
import { markAt } from './drag-point'
import { showLive } from './live-length'
import { solveDrag } from './solve-drag'
import { usePieceNames } from './use-piece-names'
import { toScreen, toSheet, type View } from './view'

interface Drag {
  readonly handle: Handle
  /** From the pointer to the mark, px, so that the mark does not jump to the pointer. */
  readonly grip: Point
  frame: number
  pointer: Point
  free: boolean
}

/** What a point is called: the values it moves. */
export function pointName(handle: Handle, nameOf: (id: string) => string): string {
  return [...new Set(handle.moves.map((move) => nameOf(move.value)))].join(' and ')
}

/**
 * The points that can be dragged, as real buttons over the sheet: drag, or focus and use the arrow keys. Each moves a style measurement, and the
 * draft is solved again as it goes. Escape puts everything back exactly.
 */
export function Points({
  handles,
  places,
  view,
  area,
}: {
  readonly handles: readonly Handle[]
  readonly places: () => Places
  readonly view: () => View
  readonly area: () => DOMRect | undefined
}) {
  const { store, garment, engine, writable } = useStudio()
  const drag = useRef<Drag>(undefined)
  const names = usePieceNames()
  const chip = useRef<HTMLSpanElement>(null)
  const nameOf = (id: string) => garment.design.find((value) => value.id === id)?.name ?? id

  function wordsFor(handle: Handle, stopped: string): string {
    const { order, unit } = store.get()
    const values = handle.moves.map((move) => {
      const ref: FieldRef = `design.${move.value}`
      const kind = kindOf(garment, ref)
      const value = currentValue(garment, order, ref) ?? ''
      return `${nameOf(move.value)} ${formatValue(kind, value, unit)} ${unitWord(kind, unit)}`.trim()
    })
    return [...new Set(values)].join(' · ') + stopped
  }

  function follow(now: Drag) {
    now.frame = 0
    const box = area()
    const { draft, order, unit } = store.get()
    const at = draft && markAt(draft, now.handle.piece, now.handle.mark)
    if (!box || !at) return
    const place = places()[now.handle.piece]
    const pointer = { x: now.pointer.x - box.left + now.grip.x, y: now.pointer.y - box.top + now.grip.y }
    const target = intoPiece(toSheet(view(), pointer), place)
    const setting = { draftGarment: engine.draftGarment, garment, unit, onTape: !now.free }
    const step = solveDrag(setting, order, now.handle, at, target)
    if (step) {
      const fields = step.asked.map(({ ref, value }) => ({ ref, value, text: textFor(ref, value) }))
      store.take(fields, step.draft)
    }
    const stopped = step?.asked.some((one) => one.stopped) ? ' · as far as it goes' : ''
    showLive(chip.current, wordsFor(now.handle, stopped), pointer)
  }

  function textFor(ref: FieldRef, value: number): string {
    const { unit } = store.get()
    const kind = kindOf(garment, ref)
    return typedWithUnit(kind, formatValue(kind, value, unit), unit)
  }

  function down(event: PointerEvent<HTMLButtonElement>, handle: Handle) {
    const box = area()
    const { draft } = store.get()
    const at = draft && markAt(draft, handle.piece, handle.mark)
    if (event.button !== 0 || !box || !at || !writable) return
    // A field that is being typed in keeps its value before the drag begins.
    if (document.activeElement instanceof HTMLElement) document.activeElement.blur()
    event.currentTarget.focus()
    event.currentTarget.setPointerCapture(event.pointerId)
    const onScreen = toScreen(view(), applyTo(placeTransform(places()[handle.piece]), at))
    const pointer = { x: event.clientX, y: event.clientY }
    const grip = { x: onScreen.x - (pointer.x - box.left), y: onScreen.y - (pointer.y - box.top) }
    drag.current = { handle, grip, frame: 0, pointer, free: event.altKey }
    store.begin()
    showLive(chip.current, wordsFor(handle, ''), { x: pointer.x - box.left, y: pointer.y - box.top })
  }

  function move(event: PointerEvent<HTMLButtonElement>) {
    const now = drag.current
    if (!now) return
    now.pointer = { x: event.clientX, y: event.clientY }
    now.free = event.altKey
    now.frame ||= requestAnimationFrame(() => follow(now))
  }

  function finish(keep: boolean) {
    const now = drag.current
    if (!now) return
    drag.current = undefined
    if (now.frame) cancelAnimationFrame(now.frame)
    if (keep) {
      if (now.frame) follow(now)
      store.commit(pointName(now.handle, nameOf))
    } else store.cancel()
    showLive(chip.current, undefined)
  }

  function key(event: KeyboardEvent<HTMLButtonElement>, handle: Handle) {
    if (event.key === 'Escape') {
      if (drag.current) event.preventDefault()
      finish(false)
      return
    }
    const direction = arrows[event.key]
    if (!direction || !writable) return
    event.preventDefault()
    nudge(handle, direction, event.shiftKey)
  }

  /** Moves the value whose line lies closest along the arrow. */
  function nudge(handle: Handle, direction: Point, large: boolean) {
    const along = (move: Handle['moves'][number]) => move.along.x * direction.x + move.along.y * direction.y
    const best = [...handle.moves].sort((a, b) => Math.abs(along(b)) - Math.abs(along(a)))[0]
    if (!best || Math.abs(along(best)) < 0.2) return
    const ref: FieldRef = `design.${best.value}`
    const kind = kindOf(garment, ref)
    const { order, unit } = store.get()
    const value = currentValue(garment, order, ref)
    if (typeof value !== 'number') return
    const sign = along(best) * best.perMm > 0 ? 1 : -1
    const next = nudged(kind, value, unit, sign, large)
    store.begin()
    const problems = store.putAll([{ ref, value: next, text: textFor(ref, next) }], true)
    store.commit(nameOf(best.value))
    if (problems[0]) store.say(problems[0].message)
    else if (kind === 'length') store.say(`${nameOf(best.value)} ${lengthInWords(next, unit)}`)
  }

  return (
    <>
      <ul aria-label="Points" className="pointer-events-none absolute inset-0">
        {byPiece(handles).map(({ piece, items }) => (
          <li key={`${piece}/${items[0]?.id}`}>
            <ul aria-label={names.get(piece)}>
              {items.map((handle) => (
                <li key={handle.id} data-point={handle.id} className="absolute top-0 left-0">
                  <button
                    type="button"
                    aria-label={`Point for ${pointName(handle, nameOf)}`}
                    aria-roledescription="point"
                    onPointerDown={(event) => down(event, handle)}
                    onPointerMove={move}
                    onPointerUp={() => finish(true)}
                    onPointerCancel={() => finish(false)}
                    onKeyDown={(event) => key(event, handle)}
                    className="group/point pointer-events-auto absolute grid size-6 -translate-1/2 cursor-grab touch-none place-items-center rounded-full active:cursor-grabbing pointer-coarse:size-11"
                  >
                    <span
                      aria-hidden
                      className="size-2.5 rounded-full border-2 border-indigo bg-sheet group-hover/point:size-3.5 group-active/point:bg-indigo"
                    />
                  </button>
                </li>
              ))}
            </ul>
          </li>
        ))}
      </ul>
      <span
        ref={chip}
        hidden
        className="measure pointer-events-none absolute top-0 left-0 z-40 bg-ink px-2 py-0.5 text-tag text-ground"
      />
    </>
  )
}

const arrows: Readonly<Record<string, Point | undefined>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
}

/** A place on the sheet → the same place in a piece's own frame. */
function intoPiece(at: Point, place: Places[string] | undefined): Point {
  const moved = { x: at.x - (place?.x ?? 0), y: at.y - (place?.y ?? 0) }
  const turn = ((place?.turn ?? 0) * Math.PI) / 180
  return {
    x: moved.x * Math.cos(turn) + moved.y * Math.sin(turn),
    y: moved.y * Math.cos(turn) - moved.x * Math.sin(turn),
  }
}

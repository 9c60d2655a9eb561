'use client'

import {
  useCallback,
  useEffect,
  useImperativeHandle,
  useLayoutEffect,
  useRef,
  useState,
  type Ref,
} from 'react'
import type { Draft, MeasurementDefinition } from '@/drafting/contract'
import { boundsOf } from '@/drafting/drawing/bounds'
import { arrange, drawing, placePath, type Layer, type Places } from '@/drafting/drawing'
import { classes } from '@/components/ui/classes'
import { isStale } from '@/components/studio/state'
import { useStudio, useStudioState } from '@/components/studio/use-store'
import { FixedPoints } from './fixed-points'
import { watchView } from './gestures'
import { Points } from './points'
import { readableLabels } from './readable-labels'
import { ScaleBar } from './scale-bar'
import { createStage, type Emphasis, type Stage } from './stage'
import { Tags } from './tags'
import { useHandles, useTagEntries } from './use-sheet-data'
import { placeTagElements } from './tag-writing'
import { placePointElements } from './point-writing'
import { fitView, trueScale, zoomAt, type Size, type View } from './view'

/** What the bar and the keyboard may ask of the sheet. */
export interface SheetControl {
  readonly fit: () => void
  readonly actual: () => void
  readonly zoom: (factor: number) => void
  readonly focusTag: (step: 1 | -1) => void
}

export interface SheetProps {
  readonly control: Ref<SheetControl>
  readonly layers: readonly Layer[]
  readonly hidden: ReadonlySet<string>
  /** Lines to lay over the drawing. */
  readonly emphasise: (draft: Draft) => readonly Emphasis[]
  /** Only the emphasis is drawn: the draft is being watched as it is made. */
  readonly replaying: boolean
  readonly showTags: boolean
  readonly definitions: readonly MeasurementDefinition[]
  /** Present on a phone: a tag opens its editor instead of being one. */
  readonly onOpenTag?: (dimension: string) => void
}

/** Size of a piece's name on paper, mm, and the least it is shown at, px. */
const nameSize = 9
const readable = 14

/** The table: the drawing, its tags and points, under a window that pans and zooms. */
export function Sheet(props: SheetProps) {
  const { control, layers, hidden, emphasise, replaying, showTags, definitions, onOpenTag } = props
  const { store, writable } = useStudio()
  const area = useRef<HTMLDivElement>(null)
  const svg = useRef<SVGSVGElement>(null)
  const stage = useRef<Stage>(undefined)
  const view = useRef<View>({ scale: 0.5, x: 0, y: 0 })
  const places = useRef<Places>({})
  /** Asked of the page only when it changes: asking in every frame would lay the page out again. */
  const size = useRef<Size>({ width: 0, height: 0 })
  const [scale, setScale] = useState(0.5)
  const stale = useStudioState(isStale)
  const unit = useStudioState((state) => state.unit)
  const handles = useHandles()
  const tags = useTagEntries()

  const placesNow = useCallback(() => places.current, [])
  const viewNow = useCallback(() => view.current, [])

  const position = useCallback(() => {
    const box = area.current
    const { draft } = store.get()
    if (!box || !draft) return
    stage.current?.look(view.current)
    const points = placePointElements(box, draft, handles, places.current, view.current)
    placeTagElements(box, size.current, draft, places.current, view.current, points)
  }, [handles, store])

  const moved = useRef(false)
  const setView = useCallback(
    (next: View) => {
      view.current = next
      moved.current = true
      position()
      setScale(next.scale)
    },
    [position],
  )

  const draw = useCallback(() => {
    const { draft, unit } = store.get()
    if (!draft || !stage.current) return
    places.current = arrange(draft, { kept: places.current })
    const list = drawing(draft, {
      layers,
      places: places.current,
      unit,
      textScale: textScaleAt(view.current.scale),
    })
    const shown = readableLabels(list.items, view.current.scale).filter(
      (item) =>
        !(item.layer === 'dimension' && item.kind === 'text') && !(item.piece && hidden.has(item.piece)),
    )
    stage.current.show({ ...list, items: replaying ? [] : shown })
    stage.current.emphasise(
      emphasise(draft).map((line) => ({ ...line, path: placePath(line.path, places.current[line.piece]) })),
    )
    position()
  }, [emphasise, hidden, layers, position, replaying, store])

  const textScale = textScaleAt(scale)
  useLayoutEffect(() => draw(), [draw, textScale])

  /** Shows all pieces, or one. */
  const fit = useCallback(
    (piece?: string) => {
      const box = area.current
      const { draft } = store.get()
      if (!box || !draft) return
      const list = drawing(draft, { layers: ['cut', 'stitch', 'fold'], places: places.current })
      const own = piece ? boundsOf(list.items.filter((item) => item.piece === piece)) : list.bounds
      const size = { width: box.clientWidth, height: box.clientHeight }
      setView(fitView(own, size, size.width < 600 ? 36 : 64))
      moved.current = false
    },
    [setView, store],
  )

  useLayoutEffect(() => {
    if (!svg.current) return
    const made = createStage(svg.current)
    stage.current = made
    return () => {
      made.destroy()
      stage.current = undefined
    }
  }, [])

  useLayoutEffect(() => {
    draw()
    return store.subscribe(draw)
  }, [draw, hidden, showTags, store, tags])

  const phone = onOpenTag !== undefined
  const firstPiece = useStudioState((state) => state.draft?.pieces[0]?.id)
  useEffect(() => {
    const box = area.current
    if (!box) return
    const watch = new ResizeObserver(() => {
      size.current = { width: box.clientWidth, height: box.clientHeight }
      if (!moved.current) fit(phone ? firstPiece : undefined)
    })
    watch.observe(box)
    return () => watch.disconnect()
  }, [firstPiece, fit, phone])

  useEffect(() => {
    if (!area.current) return
    return watchView(area.current, { get: () => view.current, set: setView })
  }, [setView])

  useImperativeHandle(control, () => {
    const middle = () => ({
      x: (area.current?.clientWidth ?? 0) / 2,
      y: (area.current?.clientHeight ?? 0) / 2,
    })
    return {
      fit: () => fit(),
      actual: () => setView(zoomAt(view.current, middle(), trueScale / view.current.scale)),
      zoom: (factor) => setView(zoomAt(view.current, middle(), factor)),
      focusTag: (step) => {
        const inputs = [...(area.current?.querySelectorAll<HTMLInputElement>('[data-tag] input') ?? [])]
        const now = inputs.findIndex((input) => input === document.activeElement)
        inputs[(now + step + inputs.length) % inputs.length]?.focus()
      },
    }
  }, [fit, setView])

  return (
    <div ref={area} className="relative h-full touch-none overflow-hidden bg-sheet select-none" data-sheet>
      <svg
        ref={svg}
        aria-hidden
        className={classes('absolute inset-0 size-full transition-opacity', stale && 'opacity-35')}
      />
      {showTags && !replaying && (
        <>
          <Tags tags={tags.filter((tag) => !hidden.has(tag.piece))} onOpen={onOpenTag} />
          <Points
            handles={handles.filter((handle) => !hidden.has(handle.piece))}
            places={placesNow}
            view={viewNow}
            area={() => area.current?.getBoundingClientRect()}
          />
          {writable && (
            <FixedPoints {...{ handles, hidden, definitions }} places={placesNow} view={viewNow} />
          )}
        </>
      )}
      <ScaleBar scale={scale} unit={unit} />
    </div>
  )
}

/** Labels grow as the sheet is shown smaller, in steps, so that a piece's name can be read at any zoom. */
function textScaleAt(scale: number): number {
  const wanted = readable / (nameSize * scale)
  const step = Math.round(Math.log2(Math.min(5, Math.max(1, wanted))) * 2) / 2
  return 2 ** step
}

import { panBy, zoomAt, type View } from './view'

export interface ViewHost {
  readonly get: () => View
  readonly set: (view: View) => void
}

interface Finger {
  readonly x: number
  readonly y: number
}

/** px a wheel's line is worth, where a device counts in lines. */
const line = 16

/**
 * Pans and zooms a sheet: wheel or two fingers pan, ctrl+wheel or a pinch zooms at the pointer, a drag on the bare sheet (or anywhere with
 * Space or the middle button held) pans.
 * @param area what is listened to; its top left corner is the view's origin
 * @returns takes all listeners away again
 */
export function watchView(area: HTMLElement, host: ViewHost): () => void {
  const fingers = new Map<number, Finger>()
  const off = new AbortController()
  let space = false

  const place = (event: { clientX: number; clientY: number }) => {
    const box = area.getBoundingClientRect()
    return { x: event.clientX - box.left, y: event.clientY - box.top }
  }

  function wheel(event: WheelEvent) {
    event.preventDefault()
    const unit = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? line : 1
    if (event.ctrlKey || event.metaKey) {
      host.set(zoomAt(host.get(), place(event), Math.exp((-event.deltaY * unit) / 300)))
      return
    }
    const sideways = event.shiftKey && event.deltaX === 0
    host.set(
      panBy(
        host.get(),
        -(sideways ? event.deltaY : event.deltaX) * unit,
        sideways ? 0 : -event.deltaY * unit,
      ),
    )
  }

  function down(event: PointerEvent) {
    const onControl = event.target instanceof Element && event.target.closest('input, button, [data-point]')
    const forced = space || event.button === 1
    if (onControl && !forced) return
    if (event.button !== 0 && event.button !== 1) return
    event.preventDefault()
    if (document.activeElement instanceof HTMLElement) document.activeElement.blur()
    area.setPointerCapture(event.pointerId)
    fingers.set(event.pointerId, place(event))
  }

  function move(event: PointerEvent) {
    const before = fingers.get(event.pointerId)
    if (!before) return
    const now = place(event)
    const other = [...fingers].find(([id]) => id !== event.pointerId)?.[1]
    fingers.set(event.pointerId, now)
    if (!other) {
      host.set(panBy(host.get(), now.x - before.x, now.y - before.y))
      return
    }
    const was = Math.hypot(before.x - other.x, before.y - other.y)
    const is = Math.hypot(now.x - other.x, now.y - other.y)
    const middle = { x: (before.x + other.x) / 2, y: (before.y + other.y) / 2 }
    const zoomed = was > 0 ? zoomAt(host.get(), middle, is / was) : host.get()
    host.set(panBy(zoomed, (now.x - before.x) / 2, (now.y - before.y) / 2))
  }

  const up = (event: PointerEvent) => fingers.delete(event.pointerId)
  const typing = (event: Event) =>
    event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement
  const key = (pressed: boolean) => (event: KeyboardEvent) => {
    if (event.code === 'Space' && !typing(event)) space = pressed
  }

  const options = { signal: off.signal }
  area.addEventListener('wheel', wheel, { ...options, passive: false })
  area.addEventListener('pointerdown', down, options)
  area.addEventListener('pointermove', move, options)
  area.addEventListener('pointerup', up, options)
  area.addEventListener('pointercancel', up, options)
  window.addEventListener('keydown', key(true), options)
  window.addEventListener('keyup', key(false), options)
  return () => off.abort()
}

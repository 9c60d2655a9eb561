import type { Point } from '@/drafting/contract'

/** Where the sheet stands under the window: screen px = sheet mm × scale + (x, y). */
export interface View {
  readonly scale: number
  readonly x: number
  readonly y: number
}

export interface Size {
  readonly width: number
  readonly height: number
}

export interface Bounds {
  readonly min: Point
  readonly max: Point
}

/** px per mm at which a CSS millimetre is drawn as a millimetre. */
export const trueScale = 96 / 25.4

const least = 0.04
const most = 12

/** Sheet mm → px from the window's top left corner. */
export function toScreen(view: View, at: Point): Point {
  return { x: at.x * view.scale + view.x, y: at.y * view.scale + view.y }
}

/** Px from the window's top left corner → sheet mm. */
export function toSheet(view: View, at: Point): Point {
  return { x: (at.x - view.x) / view.scale, y: (at.y - view.y) / view.scale }
}

/** Moves the sheet by so many px. */
export function panBy(view: View, dx: number, dy: number): View {
  return { ...view, x: view.x + dx, y: view.y + dy }
}

/** Zooms by a factor about a place on the screen, which stays where it is. The scale stops at 0.04 and 12 px a mm. */
export function zoomAt(view: View, at: Point, factor: number): View {
  const scale = Math.min(most, Math.max(least, view.scale * factor))
  const held = toSheet(view, at)
  return { scale, x: at.x - held.x * scale, y: at.y - held.y * scale }
}

/** The view that shows the whole of `bounds` (mm) in the middle of a window (px), with an even margin. */
export function fitView(bounds: Bounds, size: Size, margin = 40): View {
  const width = Math.max(1, bounds.max.x - bounds.min.x)
  const height = Math.max(1, bounds.max.y - bounds.min.y)
  const scale = Math.min(
    most,
    Math.max(
      least,
      Math.min(Math.max(1, size.width - 2 * margin) / width, Math.max(1, size.height - 2 * margin) / height),
    ),
  )
  return {
    scale,
    x: size.width / 2 - ((bounds.min.x + bounds.max.x) / 2) * scale,
    y: size.height / 2 - ((bounds.min.y + bounds.max.y) / 2) * scale,
  }
}

import type { Path, Point } from '../contract'
import { pathLength } from '../geometry'
import { solveBetween } from '../pen/solve'
import { headHalf, type Fullness } from './sleeve-head'

const level = { x: 1, y: 0 }

/** The half girth of a sleeve at which a head of one length and height is reached, mm; undefined when there is none. */
function widthFor(
  height: number,
  length: number,
  arrives: (width: number) => Point,
  fullness: Fullness,
): number | undefined {
  return solveBetween(
    (width) =>
      pathLength(headHalf({ x: 0, y: 0 }, { x: width, y: height }, arrives(width), fullness)) - length,
    height * 0.25,
    length,
    1e-7,
  )
}

/**
 * The height of a sleeve head and how its girth divides into front and back, so that each half of the head has its length.
 *
 * @param girth sleeve girth at the underarm, mm.
 * @param front, back lengths of the two halves of the head, mm.
 * @returns height, front and back widths in mm; undefined when no height does it.
 */
export function solveHead(
  girth: number,
  front: number,
  back: number,
  shapes: { readonly front: Fullness; readonly back: Fullness },
): { readonly height: number; readonly front: number; readonly back: number } | undefined {
  const flat = (): Point => level
  const spare = (height: number): number => {
    const f = widthFor(height, front, flat, shapes.front)
    const b = widthFor(height, back, flat, shapes.back)
    return (f ?? 0) + (b ?? 0) - girth
  }
  const shorter = Math.min(front, back)
  const height = solveBetween(spare, shorter * 0.08, shorter * 0.93, 1e-6)
  if (height === undefined) return undefined
  const f = widthFor(height, front, flat, shapes.front)
  const b = widthFor(height, back, flat, shapes.back)
  return f === undefined || b === undefined ? undefined : { height, front: f, back: b }
}

/**
 * Draws one half of a head to an exact length between two given points by changing how full it is.
 *
 * @returns the half, or undefined when the points are too far apart or too near for that length.
 */
export function fitHead(
  crown: Point,
  underarm: Point,
  arrives: Point,
  length: number,
  shape: Fullness,
): Path | undefined {
  if (underarm.y - crown.y < 0.04 * (underarm.x - crown.x)) return undefined
  const drawn = (lean: number): Path => headHalf(crown, underarm, arrives, { ...shape, lean })
  const chord = Math.atan2(underarm.y - crown.y, underarm.x - crown.x)
  // Past a right angle the head would lean over itself.
  const most = (Math.PI * 0.47 - chord) / chord
  const lean = solveBetween((value) => pathLength(drawn(value)) - length, 0.02, most, 1e-9)
  return lean === undefined ? undefined : drawn(lean)
}

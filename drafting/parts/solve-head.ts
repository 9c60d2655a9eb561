import type { Path, Point } from '../contract'
import { segmentLength } from '../geometry'
import { solveBetween } from '../pen/solve'
import { headWidth, highest, lowest } from './head-table'
import { headHalf, leanUnit, type Fullness } from './sleeve-head'

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
  const width = (height: number): number =>
    headWidth(front, height, shapes.front) + headWidth(back, height, shapes.back)
  const height = solveBetween(
    (value) => width(value) - girth,
    Math.max(front, back) * lowest,
    Math.min(front, back) * highest,
    1e-9,
  )
  if (height === undefined) return undefined
  return {
    height,
    front: headWidth(front, height, shapes.front),
    back: headWidth(back, height, shapes.back),
  }
}

/** A head lower than this share of its width, or that leans less, has ripples instead of a bell; found by searching. */
const flattest = 0.16
const least = 0.22

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
  if (underarm.y - crown.y < flattest * (underarm.x - crown.x)) return undefined
  const drawn = (lean: number): Path => headHalf(crown, underarm, arrives, { ...shape, lean })
  const over = (lean: number): number => {
    const half = drawn(lean)
    let sum = -length
    for (const segment of half.segments) sum += segmentLength(segment)
    return sum
  }
  const chord = Math.atan2(underarm.y - crown.y, underarm.x - crown.x)
  // Past a right angle the head would lean over itself.
  const most = (Math.PI * 0.47 - chord) / leanUnit(chord)
  let before = shape.lean
  let now = before * 1.02
  if (now < most) {
    let fBefore = over(before)
    for (let round = 0; round < 8; round += 1) {
      const fNow = over(now)
      if (Math.abs(fNow) < 1e-9) return drawn(now)
      const next = now - (fNow * (now - before)) / (fNow - fBefore)
      if (!(next > least && next < most)) break
      before = now
      fBefore = fNow
      now = next
    }
  }
  const lean = solveBetween(over, least, most, 1e-9)
  return lean === undefined ? undefined : drawn(lean)
}

import { segmentLength } from '../geometry'
import { solveBetween } from '../pen/solve'
import { headHalf, type Fullness } from './sleeve-head'

/** Heights, as a share of the length of the half head, between which a sleeve head is looked for. */
export const lowest = 0.05
export const highest = 0.85
const nodes = 32

const level = { x: 1, y: 0 }

/** Length of a half head whose chord is 1 and stands at an angle (radians) below the level. */
function lengthAt(angle: number, shape: Fullness): number {
  const half = headHalf({ x: 0, y: 0 }, { x: Math.cos(angle), y: Math.sin(angle) }, level, shape)
  return half.segments.reduce((sum, segment) => sum + segmentLength(segment), 0)
}

/**
 * The width of a half head of length 1 for each height: the family of heads is the same at every size, so one short
 * Chebyshev series serves all sleeves, and solving a sleeve draws no curve at all. Good to about 1e-6; what is left is taken
 * up when the head is drawn to its exact length.
 */
function widthSeries(shape: Fullness): Float64Array {
  const values = Array.from({ length: nodes }, (_, index) => {
    const place = Math.cos((Math.PI * (index + 0.5)) / nodes)
    const height = (lowest + highest) / 2 + ((highest - lowest) / 2) * place
    const angle = solveBetween((a) => Math.sin(a) / lengthAt(a, shape) - height, 0.01, 1.4, 1e-12) ?? 0
    return Math.cos(angle) / lengthAt(angle, shape)
  })
  return Float64Array.from({ length: nodes }, (_, order) => {
    const sum = values.reduce(
      (total, value, index) => total + value * Math.cos((Math.PI * order * (index + 0.5)) / nodes),
      0,
    )
    return (sum * (order === 0 ? 1 : 2)) / nodes
  })
}

const series = new WeakMap<Fullness, Float64Array>()

/** Width of a half head, mm, from its length and height, mm. */
export function headWidth(length: number, height: number, shape: Fullness): number {
  let terms = series.get(shape)
  if (!terms) series.set(shape, (terms = widthSeries(shape)))
  const place = (2 * (height / length) - lowest - highest) / (highest - lowest)
  let next = 0
  let afterNext = 0
  for (let order = nodes - 1; order > 0; order -= 1) {
    const now = 2 * place * next - afterNext + (terms[order] as number)
    afterNext = next
    next = now
  }
  return length * (place * next - afterNext + (terms[0] as number))
}

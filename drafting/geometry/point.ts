import type { Point } from '../contract'

/** A point (or vector) at x, y in mm; x to the right, y down the body. */
export const point = (x: number, y: number): Point => ({ x, y })

export const add = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y })

/** The vector from b to a. */
export const subtract = (a: Point, b: Point): Point => ({ x: a.x - b.x, y: a.y - b.y })

export const scale = (a: Point, factor: number): Point => ({ x: a.x * factor, y: a.y * factor })

export const dot = (a: Point, b: Point): number => a.x * b.x + a.y * b.y

/** Positive when b turns clockwise from a, as seen on the sheet. */
export const cross = (a: Point, b: Point): number => a.x * b.y - a.y * b.x

/** Length of a vector, mm. */
export const magnitude = (a: Point): number => Math.sqrt(a.x * a.x + a.y * a.y)

/** Distance between two points, mm. */
export const distance = (a: Point, b: Point): number => {
  const x = b.x - a.x
  const y = b.y - a.y
  return Math.sqrt(x * x + y * y)
}

/** The vector at length 1; a vector without length points along +x, so that nothing downstream turns NaN. */
export const unit = (a: Point): Point => {
  const length = magnitude(a)
  return length > 0 ? { x: a.x / length, y: a.y / length } : { x: 1, y: 0 }
}

/** The point at the share t of the way from a to b. */
export const lerp = (a: Point, b: Point, t: number): Point => ({
  x: a.x + (b.x - a.x) * t,
  y: a.y + (b.y - a.y) * t,
})

/** The vector turned 90° clockwise on the sheet: to the right of travel, into a clockwise outline. */
export const perpendicular = (a: Point): Point => ({ x: -a.y, y: a.x })

/** Unit vector at an angle in degrees: 0° = +x, 90° = down. Exact at the quarter turns. */
export const towards = (degrees: number): Point => {
  const turn = ((degrees % 360) + 360) % 360
  if (turn === 0) return { x: 1, y: 0 }
  if (turn === 90) return { x: 0, y: 1 }
  if (turn === 180) return { x: -1, y: 0 }
  if (turn === 270) return { x: 0, y: -1 }
  const radians = (turn * Math.PI) / 180
  return { x: Math.cos(radians), y: Math.sin(radians) }
}

/** The point turned clockwise by so many degrees about another (the origin when absent). */
export const rotate = (a: Point, degrees: number, about?: Point): Point => {
  const { x: c, y: s } = towards(degrees)
  const ox = about ? about.x : 0
  const oy = about ? about.y : 0
  const x = a.x - ox
  const y = a.y - oy
  return { x: ox + x * c - y * s, y: oy + x * s + y * c }
}

import type { Kind } from './formula'

/** What a value measures, as powers: a length is {length: 1, angle: 0}, an area {length: 2, angle: 0}. */
export interface Dimension {
  readonly length: number
  readonly angle: number
}

export const dimensionOf: Readonly<Record<Kind, Dimension>> = {
  length: { length: 1, angle: 0 },
  angle: { length: 0, angle: 1 },
  number: { length: 0, angle: 0 },
}

export function sameDimension(a: Dimension, b: Dimension): boolean {
  return a.length === b.length && a.angle === b.angle
}

/** The dimension of a × bᵖᵒʷᵉʳ. */
export function multiplied(a: Dimension, b: Dimension, power: 1 | -1): Dimension {
  return { length: a.length + power * b.length, angle: a.angle + power * b.angle }
}

export function rootOf({ length, angle }: Dimension): Dimension {
  return { length: length / 2, angle: angle / 2 }
}

const inWords: readonly (readonly [Dimension, string])[] = [
  [dimensionOf.number, 'a bare number'],
  [dimensionOf.length, 'a length'],
  [dimensionOf.angle, 'an angle'],
  [{ length: 2, angle: 0 }, 'an area'],
  [{ length: 3, angle: 0 }, 'a volume'],
  [{ length: -1, angle: 0 }, 'a number per length'],
]

/** 'a length', 'a bare number', 'an area'… */
export function describeDimension(dimension: Dimension): string {
  return inWords.find(([known]) => sameDimension(known, dimension))?.[1] ?? 'a mixture of lengths and angles'
}

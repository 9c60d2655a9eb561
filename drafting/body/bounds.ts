/** The usual least and most of one measurement, mm, given the others it is judged by. */
export type Bounds = (...others: readonly number[]) => readonly [low: number, high: number]

/** Between two shares of the other measurement. */
export function share(low: number, high: number): Bounds {
  return (other = 0) => [low * other, high * other]
}

/** The other measurement and so many cm more (negative: less). */
export function more(low: number, high: number): Bounds {
  return (other = 0) => [other + low * 10, other + high * 10]
}

/** Within `below` and `above` of start + slope × other; all but the slope in cm. */
export function line(start: number, slope: number, below: number, above = below): Bounds {
  return (other = 0) => {
    const middle = start * 10 + slope * other
    return [middle - below * 10, middle + above * 10]
  }
}

/** Inside both. */
export function both(one: Bounds, two: Bounds): Bounds {
  return (...others) => {
    const [a, b] = [one(...others), two(...others)]
    return [Math.max(a[0], b[0]), Math.min(a[1], b[1])]
  }
}

/** Inside one or the other, or between them. */
export function either(one: Bounds, two: Bounds): Bounds {
  return (...others) => {
    const [a, b] = [one(...others), two(...others)]
    return [Math.min(a[0], b[0]), Math.max(a[1], b[1])]
  }
}

/** Judges only while the other measurement is at most so many cm: no survey says more. */
export function upTo(largest: number, bounds: Bounds): Bounds {
  return (other = 0) => (other <= largest * 10 ? bounds(other) : [-Infinity, Infinity])
}

/** A number rounded to a tape's fractions: sign × (whole + numerator / denominator), in lowest terms. */
export interface TapeFraction {
  readonly negative: boolean
  readonly whole: number
  /** 0 when the number is whole. */
  readonly numerator: number
  readonly denominator: number
}

/** Takes up the error of binary fractions, so that an exact half always rounds away from zero. */
const hair = 1e-9

/** Rounds to a whole number, halves away from zero, never to minus zero. */
export function roundHalfAway(value: number): number {
  const size = Math.floor(Math.abs(value) + 0.5 + hair)
  return value < 0 && size > 0 ? -size : size
}

function commonDivisor(a: number, b: number): number {
  return b === 0 ? a : commonDivisor(b, a % b)
}

/**
 * The nearest fraction of a tape.
 * @param value in whole units of the tape (inches)
 * @param denominator smallest division: 8 for eighths
 */
export function nearestFraction(value: number, denominator: number): TapeFraction {
  const parts = Math.abs(roundHalfAway(value * denominator))
  const rest = parts % denominator
  const divisor = commonDivisor(denominator, rest)
  return {
    negative: value < 0 && parts > 0,
    whole: (parts - rest) / denominator,
    numerator: rest / divisor,
    denominator: denominator / divisor,
  }
}

/** '36 1/2', '36', '1/2', '−1/2': digits and slash, with a minus sign (U+2212) where negative. */
export function fractionText({ negative, whole, numerator, denominator }: TapeFraction): string {
  const fraction = numerator === 0 ? '' : `${numerator}/${denominator}`
  const size = whole === 0 && fraction !== '' ? fraction : `${whole}${fraction === '' ? '' : ` ${fraction}`}`
  return negative ? `−${size}` : size
}

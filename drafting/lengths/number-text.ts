/**
 * Numbers as dressmakers write them: `36`, `36.5`, `36,5`, `1/2`, `½`, `36 1/2`, `36-1/2`, `36½`, `36 1⁄8`.
 * Kept as a fraction of whole numbers, so that a unit can be applied with a single rounding.
 */
export interface NumberText {
  readonly numerator: number
  readonly denominator: number
  readonly kind: 'whole' | 'decimal' | 'fraction' | 'mixed'
  /** Position after the last character read. */
  readonly end: number
}

/** Where reading failed and why. */
export class NumberTextError extends Error {
  constructor(
    message: string,
    readonly position: number,
  ) {
    super(message)
  }
}

export interface NumberStyle {
  /** `36,5` is a decimal, and `36-1/2` a mixed number. Neither holds inside a formula. */
  readonly commaAndHyphen: boolean
}

const fractionSigns: ReadonlyMap<string, readonly [number, number]> = new Map([
  ['½', [1, 2]],
  ['⅓', [1, 3]],
  ['⅔', [2, 3]],
  ['¼', [1, 4]],
  ['¾', [3, 4]],
  ['⅕', [1, 5]],
  ['⅖', [2, 5]],
  ['⅗', [3, 5]],
  ['⅘', [4, 5]],
  ['⅙', [1, 6]],
  ['⅚', [5, 6]],
  ['⅛', [1, 8]],
  ['⅜', [3, 8]],
  ['⅝', [5, 8]],
  ['⅞', [7, 8]],
])

const digits = /\d+/y
/** Slash, fraction slash U+2044 or division slash U+2215, with digits on both sides and no spaces. */
const writtenFraction = /(\d+)[/\u2044\u2215](\d+)/y
const spaces = /\s*/y
const longestNumber = 15

function match(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
  pattern.lastIndex = at
  return pattern.exec(text)
}

function wholeNumber(text: string, at: number): number {
  if (text.length > longestNumber)
    throw new NumberTextError(`This number has more than ${longestNumber} digits.`, at)
  return Number(text)
}

interface FractionText {
  readonly numerator: number
  readonly denominator: number
  readonly end: number
}

/** A fraction less than one whole, as one sign (½) or written out (1/2). */
function readFraction(text: string, at: number): FractionText | undefined {
  const sign = fractionSigns.get(text.charAt(at))
  if (sign) return { numerator: sign[0], denominator: sign[1], end: at + 1 }
  const found = match(writtenFraction, text, at)
  if (!found) return undefined
  const numerator = wholeNumber(found[1] ?? '', at)
  const below = at + (found[1] ?? '').length + 1
  const denominator = wholeNumber(found[2] ?? '', below)
  if (denominator === 0) throw new NumberTextError('A fraction cannot have 0 below the line.', below)
  return { numerator, denominator, end: at + found[0].length }
}

/** What may join a whole number to its fraction: nothing before a sign, otherwise a space or, in a length, a hyphen. */
function fractionStart(text: string, at: number, style: NumberStyle): number | undefined {
  if (fractionSigns.has(text.charAt(at))) return at
  if (style.commaAndHyphen && /[-‐‑–]/.test(text.charAt(at))) return at + 1
  const start = at + (match(spaces, text, at)?.[0].length ?? 0)
  return start > at ? start : undefined
}

function readDecimal(text: string, at: number, whole: string, style: NumberStyle): NumberText | undefined {
  const mark = text.charAt(at + whole.length)
  if (mark !== '.' && !(mark === ',' && style.commaAndHyphen)) return undefined
  const start = at + whole.length + 1
  const decimals = match(digits, text, start)?.[0] ?? ''
  if (decimals === '') throw new NumberTextError(`Digits are missing after "${mark}".`, start)
  if (mark === ',' && decimals.length > 2)
    throw new NumberTextError(
      `"${whole},${decimals}" could be a decimal or thousands: a decimal comma takes one or two digits, such as 92,7.`,
      at + whole.length,
    )
  return {
    numerator: wholeNumber(whole + decimals, at),
    denominator: 10 ** decimals.length,
    kind: 'decimal',
    end: start + decimals.length,
  }
}

function properFraction(fraction: FractionText, at: number): FractionText {
  const { numerator, denominator } = fraction
  if (numerator < denominator) return fraction
  const whole = Math.floor(numerator / denominator)
  const rest = numerator % denominator
  const plain = rest === 0 ? `${whole}` : `${whole} ${rest}/${denominator}`
  throw new NumberTextError(
    `The fraction ${numerator}/${denominator} is not less than one: write ${plain}, or put a space before the fraction.`,
    at,
  )
}

/**
 * Reads the number that starts exactly at `at`, without sign or unit. Inside a formula a fraction on its own may be
 * improper (`35/6` there is a division); in a length it must be less than one, because `361/2` is most likely a lost space.
 * @returns undefined when no number starts there
 * @throws NumberTextError with the reason and position
 */
export function readNumber(text: string, at: number, style: NumberStyle): NumberText | undefined {
  const alone = readFraction(text, at)
  if (alone) {
    const fraction = style.commaAndHyphen ? properFraction(alone, at) : alone
    return { ...fraction, kind: 'fraction' }
  }
  const whole = match(digits, text, at)?.[0] ?? ''
  const decimal = readDecimal(text, at, whole, style)
  if (decimal) return decimal
  if (whole === '') return undefined
  const end = at + whole.length
  const start = fractionStart(text, end, style)
  const part = start === undefined ? undefined : readFraction(text, start)
  const value = wholeNumber(whole, at)
  if (start === undefined || part === undefined)
    return { numerator: value, denominator: 1, kind: 'whole', end }
  const { numerator, denominator } = properFraction(part, start)
  return { numerator: value * denominator + numerator, denominator, kind: 'mixed', end: part.end }
}

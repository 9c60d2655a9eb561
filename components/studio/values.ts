import type { DesignValue, DraftOrder, GarmentDefinition } from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import { lengthDigits, parseLength, readNumber } from '@/drafting/lengths'
import { plainText } from '@/components/ui/typed-fractions'
import type { FieldRef, FieldValue } from './field-ref'
import { partsOf, valueOf } from './field-ref'
import type { Unit } from './state'

export type ValueKind = DesignValue['kind']

/** What kind of value a field takes: every measurement is a length. */
export function kindOf(garment: GarmentDefinition, ref: FieldRef): ValueKind {
  const { kind, id } = partsOf(ref)
  if (kind !== 'design') return 'length'
  return garment.design.find((value) => value.id === id)?.kind ?? 'length'
}

/** The value that an order gives a field, or the garment's own default. */
export function currentValue(
  garment: GarmentDefinition,
  order: DraftOrder,
  ref: FieldRef,
): FieldValue | undefined {
  const { kind, id } = partsOf(ref)
  const own = valueOf(order, ref)
  if (own !== undefined || kind !== 'design') return own
  return garment.design.find((value) => value.id === id)?.default
}

/**
 * Reads what was typed in a field.
 * @returns mm for a length, degrees, a share or a count as a bare number
 * @throws DraftingError with what is wrong and what a right value looks like
 */
export function parseValue(kind: ValueKind, text: string, unit: Unit, field: string): number {
  const plain = plainText(text).trim()
  if (kind === 'length') return parseSigned(plain, unit)
  const bare = plain.replace(/\s*(°|degrees?|%)$/i, '')
  const negative = /^[-−]/.test(bare)
  const start = negative ? 1 : 0
  const number = tryNumber(bare, start)
  if (number === undefined || number.end !== bare.length) {
    throw new DraftingError([{ field, code: 'bad-length', message: examples[kind] }])
  }
  const percent = plain.endsWith('%') ? 100 : 1
  return ((negative ? -1 : 1) * number.numerator) / number.denominator / percent
}

const examples: Record<ValueKind, string> = {
  length: 'Write a length such as 7 3/8 or 18.5 cm.',
  angle: 'Write an angle in degrees, such as 22 1/2.',
  share: 'Write a share of a circle, such as 1/4 or 0.25.',
  count: 'Write a whole number, such as 4.',
  choice: 'Choose one from the list.',
  'yes-no': 'Choose yes or no.',
}

/** A length that may stand below zero, as an ease or a lift can. */
function parseSigned(text: string, unit: Unit): number {
  const negative = /^[-−]\s*(?=[\d.,½⅓⅔¼¾⅛⅜⅝⅞])/.exec(text)
  return negative ? -parseLength(text.slice(negative[0].length), unit) : parseLength(text, unit)
}

function tryNumber(text: string, at: number) {
  try {
    return readNumber(text, at, { commaAndHyphen: true })
  } catch {
    return undefined
  }
}

/** A value as it stands in its field: '7 3/8', '22.5', '1/4'. Lengths to the nearest eighth or millimetre. */
export function formatValue(kind: ValueKind, value: FieldValue, unit: Unit): string {
  if (typeof value !== 'number') return String(value)
  if (kind === 'length') return lengthDigits(value, unit)
  if (kind === 'share') return shareText(value)
  return String(Math.round(value * 100) / 100)
}

/** 0.25 → '1/4', 0.375 → '3/8'; a share that is no simple part stays a decimal. */
function shareText(share: number): string {
  for (const parts of [1, 2, 3, 4, 6, 8, 12, 16]) {
    const count = share * parts
    if (Math.abs(count - Math.round(count)) < 1e-6) {
      const whole = Math.floor(Math.round(count) / parts)
      const rest = Math.round(count) - whole * parts
      if (rest === 0) return String(whole)
      return whole > 0 ? `${whole} ${rest}/${parts}` : `${rest}/${parts}`
    }
  }
  return String(Math.round(share * 1000) / 1000)
}

/** What stands after the field: in, cm, °, of a circle. */
export function unitWord(kind: ValueKind, unit: Unit): string {
  if (kind === 'length') return unit
  if (kind === 'angle') return '°'
  return kind === 'share' ? 'of a circle' : ''
}

/** A typed length with its unit, so that 36½ typed in inches is still 36½ in when centimetres are shown and shown again. */
export function typedWithUnit(kind: ValueKind, text: string, unit: Unit): string {
  const plain = plainText(text).trim()
  return kind === 'length' && /[\d½⅓⅔¼¾⅛⅜⅝⅞]$/.test(plain) ? `${plain} ${unit}` : plain
}

/** The text a field shows: as typed while it is of the shown unit and still says what is drafted, else worked out afresh. */
export function shownText(
  kind: ValueKind,
  value: FieldValue | undefined,
  typed: string | undefined,
  unit: Unit,
): string {
  if (value === undefined) return ''
  if (typed && typeof value === 'number') {
    const own = kind === 'length' ? typed.endsWith(` ${unit}`) : true
    if (own && stillSays(kind, typed, unit, value))
      return kind === 'length' ? typed.slice(0, -unit.length - 1) : typed
  }
  return formatValue(kind, value, unit)
}

function stillSays(kind: ValueKind, typed: string, unit: Unit, value: number): boolean {
  try {
    return Math.abs(parseValue(kind, typed, unit, '') - value) < 1e-6
  } catch {
    return false
  }
}

/** How far an arrow key moves a value: ⅛ in or 1 mm, with Shift 1 in or 10 mm; one degree, a sixteenth of a circle, one. */
export function nudgeOf(kind: ValueKind, unit: Unit, large: boolean): number {
  if (kind === 'length') return unit === 'in' ? (large ? 25.4 : 25.4 / 8) : large ? 10 : 1
  if (kind === 'angle') return large ? 5 : 1
  if (kind === 'share') return large ? 1 / 8 : 1 / 32
  return 1
}

/** A value moved by so many nudges, and landed on the tape's own divisions. */
export function nudged(
  kind: ValueKind,
  value: number,
  unit: Unit,
  direction: 1 | -1,
  large: boolean,
): number {
  const fine = nudgeOf(kind, unit, false)
  const moved = value + direction * nudgeOf(kind, unit, large)
  return Math.round(moved / fine) * fine
}

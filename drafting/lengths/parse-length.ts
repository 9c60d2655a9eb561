import type { Unit } from '../contract'
import { badLength } from './bad-length'
import { NumberTextError, readNumber, type NumberText } from './number-text'
import { readUnit, writtenUnit, type WrittenUnit } from './units'

const example = 'such as 36 1/2 in, 92.7 cm or 927 mm'
const longestText = 60
/** 100 m: far beyond any body or cloth, well inside what is stored. */
const largest = 100_000
const style = { commaAndHyphen: true }

function skipSpaces(text: string, at: number): number {
  let end = at
  while (end < text.length && /\s/.test(text.charAt(end))) end += 1
  return end
}

function millimetres(number: NumberText, unit: WrittenUnit): number {
  return (number.numerator * unit.tenths) / (number.denominator * 10)
}

interface Quantity {
  readonly number: NumberText
  readonly unit?: WrittenUnit
  /** Position of the next character that is no space. */
  readonly end: number
}

function readQuantity(text: string, at: number, field: string): Quantity {
  const number = readNumber(text, at, style)
  if (!number)
    throw badLength(
      at === text.length
        ? `A number is missing: type a length, ${example}.`
        : `"${text.charAt(at)}" is not a number: type a length, ${example}.`,
      field,
      at,
    )
  const next = skipSpaces(text, number.end)
  const found = readUnit(text, next)
  return found ? { number, unit: found.unit, end: skipSpaces(text, found.end) } : { number, end: next }
}

function refuseRest(text: string, at: number, field: string): void {
  if (at >= text.length) return
  const rest = text.slice(at)
  if (/^\d/.test(rest))
    throw badLength(
      `There is a second number, "${rest}": write a fraction as 36 1/2, with one unit, ${example}.`,
      field,
      at,
    )
  throw badLength(`"${rest}" is not expected here: type a length, ${example}.`, field, at)
}

/** Feet take whole numbers, and inches behind them stay below a foot. */
function inchesAfterFeet(text: string, feet: Quantity, field: string): number {
  if (feet.end >= text.length) return 0
  if (feet.number.kind !== 'whole')
    throw badLength('Feet before inches are a whole number, such as 3\' 0 1/2".', field, 0)
  const inches = readQuantity(text, feet.end, field)
  if (inches.unit && inches.unit.id !== 'in')
    throw badLength('After feet come inches, such as 3\' 0 1/2".', field, feet.end)
  const mm = millimetres(inches.number, writtenUnit('in'))
  if (mm >= 304.8) throw badLength('After feet the inches are less than 12.', field, feet.end)
  refuseRest(text, inches.end, field)
  return mm
}

function readLength(text: string, unit: Unit, field: string): number {
  const start = skipSpaces(text, 0)
  if (start === text.length) throw badLength(`Nothing is typed: type a length, ${example}.`, field, 0)
  const negative = /[-−]/.test(text.charAt(start))
  const quantity = readQuantity(text, negative ? skipSpaces(text, start + 1) : start, field)
  let mm = millimetres(quantity.number, quantity.unit ?? writtenUnit(unit))
  if (quantity.unit?.id === 'ft') mm += inchesAfterFeet(text, quantity, field)
  else refuseRest(text, quantity.end, field)
  if (mm > largest)
    throw badLength('No length here is over 100 m: check the number and its unit.', field, start)
  return negative && mm !== 0 ? -mm : mm
}

/**
 * Reads a length as a dressmaker types it: `36 1/2`, `36-1/2`, `36½`, `36 1⁄8`, `36.5in`, `36 1/2"`, `3' 0 1/2"`, `92,7 cm`,
 * `927mm`, `1.05 m`, with a leading minus where the length runs the other way. A decimal comma takes one or two digits.
 * @param text as typed; spaces around it do not matter
 * @param unit that a number without one is read in
 * @param field named in the error
 * @returns mm, the nearest number to the exact value
 * @throws DraftingError 'bad-length' with what is wrong, its position and what a right value looks like
 */
export function parseLength(text: string, unit: Unit, field = 'length'): number {
  if (typeof text !== 'string') throw badLength(`A length is a text, ${example}.`, field)
  if (text.length > longestText)
    throw badLength(`This is ${text.length} characters long: type a length, ${example}.`, field, longestText)
  try {
    return readLength(text, unit, field)
  } catch (error) {
    if (error instanceof NumberTextError) throw badLength(error.message, field, error.position)
    throw error
  }
}

import { NumberTextError, readNumber, readUnit, type NumberText } from '../lengths'
import { FormulaFault } from './bad-formula'
import type { Kind, Operator } from './formula'

interface Placed {
  readonly at: number
  readonly end: number
}

export type Token =
  | (Placed & { readonly kind: 'number'; readonly value: number; readonly measures: Kind })
  | (Placed & { readonly kind: 'word'; readonly text: string })
  | (Placed & { readonly kind: 'operator'; readonly operator: Operator })
  | (Placed & { readonly kind: '(' | ')' | ',' | 'end' })

const operators: ReadonlyMap<string, Operator> = new Map([
  ['+', '+'],
  ['-', '−'],
  ['−', '−'],
  ['–', '−'],
  ['*', '×'],
  ['×', '×'],
  ['·', '×'],
  ['/', '÷'],
  ['÷', '÷'],
])

const word = /[\p{L}_][\p{L}\p{N}_]*/uy
const degrees = /\s*(?:°|deg(?:rees)?(?![\p{L}\p{N}_]))/uy
const spaces = /\s*/y
const style = { commaAndHyphen: false }

function matched(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at
  return pattern.exec(text)?.[0]
}

function numberAt(text: string, at: number): NumberText | undefined {
  try {
    return readNumber(text, at, style)
  } catch (error) {
    if (error instanceof NumberTextError) throw new FormulaFault(error.message, error.position)
    throw error
  }
}

/** A number with its unit. `1/2 in` is half an inch; a written fraction without a unit is left as a division. */
function numberToken(text: string, at: number, number: NumberText): Token {
  const bare = number.numerator / number.denominator
  const turned = matched(degrees, text, number.end)
  if (turned !== undefined)
    return { kind: 'number', value: bare, measures: 'angle', at, end: number.end + turned.length }
  const found = readUnit(text, number.end + (matched(spaces, text, number.end)?.length ?? 0))
  if (found) {
    const value = (number.numerator * found.unit.tenths) / (number.denominator * 10)
    return { kind: 'number', value, measures: 'length', at, end: found.end }
  }
  const whole = number.kind === 'fraction' ? (/^\d+/.exec(text.slice(at, number.end))?.[0] ?? '') : ''
  if (whole !== '')
    return { kind: 'number', value: Number(whole), measures: 'number', at, end: at + whole.length }
  return { kind: 'number', value: bare, measures: 'number', at, end: number.end }
}

function unexpected(text: string, at: number): FormulaFault {
  const character = String.fromCodePoint(text.codePointAt(at) ?? 0)
  const hint = character === '^' ? ': write a × a instead of a power' : ''
  return new FormulaFault(`"${character}" has no meaning in a formula${hint}.`, at)
}

/**
 * The token at or after `from`, spaces skipped.
 * @throws FormulaFault at a character or number that no formula holds
 */
export function tokenAt(text: string, from: number): Token {
  const at = from + (matched(spaces, text, from)?.length ?? 0)
  const end = at + 1
  const character = text.charAt(at)
  if (character === '') return { kind: 'end', at, end: at }
  if (character === '(' || character === ')' || character === ',') return { kind: character, at, end }
  const operator = operators.get(character)
  if (operator) return { kind: 'operator', operator, at, end }
  const number = numberAt(text, at)
  if (number) return numberToken(text, at, number)
  const name = matched(word, text, at)
  if (name !== undefined) return { kind: 'word', text: name, at, end: at + name.length }
  throw unexpected(text, at)
}

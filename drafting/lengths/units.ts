import type { Unit } from '../contract'

/** Millimetres in one unit, exactly. */
export const millimetresPer: Readonly<Record<Unit, number>> = { in: 25.4, cm: 10 }

/** A unit as written behind a number, with its size in tenths of a millimetre so that inches stay exact. */
export interface WrittenUnit {
  readonly id: 'in' | 'cm' | 'mm' | 'm' | 'ft'
  readonly tenths: number
}

const inch: WrittenUnit = { id: 'in', tenths: 254 }
const centimetre: WrittenUnit = { id: 'cm', tenths: 100 }
const millimetre: WrittenUnit = { id: 'mm', tenths: 10 }
const metre: WrittenUnit = { id: 'm', tenths: 10_000 }
const foot: WrittenUnit = { id: 'ft', tenths: 3_048 }

/** Unit words and signs. Two apostrophes are an inch sign; one is a foot. */
const spellings: ReadonlyMap<string, WrittenUnit> = new Map([
  ...['in', 'inch', 'inches', '"', '″', '”', "''", '′′', '’’'].map((text) => [text, inch] as const),
  ...['cm', 'centimetre', 'centimetres', 'centimeter', 'centimeters'].map(
    (text) => [text, centimetre] as const,
  ),
  ...['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters'].map(
    (text) => [text, millimetre] as const,
  ),
  ...['m', 'metre', 'metres', 'meter', 'meters'].map((text) => [text, metre] as const),
  ...['ft', 'foot', 'feet', "'", '′', '’'].map((text) => [text, foot] as const),
])

const unitText = /\p{L}+|["″”]|'{1,2}|′{1,2}|’{1,2}/uy

/** The unit that starts exactly at `at`, or undefined when what stands there is none. A full stop after a word belongs to it. */
export function readUnit(
  text: string,
  at: number,
): { readonly unit: WrittenUnit; readonly end: number } | undefined {
  unitText.lastIndex = at
  const found = unitText.exec(text)?.[0]
  const unit = found === undefined ? undefined : spellings.get(found.toLowerCase())
  if (found === undefined || unit === undefined) return undefined
  const end = at + found.length
  return { unit, end: /[a-z]$/i.test(found) && text[end] === '.' ? end + 1 : end }
}

/** The unit a bare number is read in. */
export function writtenUnit(unit: Unit): WrittenUnit {
  return unit === 'in' ? inch : centimetre
}

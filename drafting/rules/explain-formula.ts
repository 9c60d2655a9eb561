import type { Unit } from '../contract'
import { lengthDigits, millimetresPer, roundToTape, type LengthFormat } from '../lengths'
import type { Kinds } from './check-formula-kinds'
import { evaluateFormula } from './evaluate-formula'
import type { Formula, Kind, Values } from './formula'
import { ShownSum, shownNumber } from './shown-sum'

const fewestDecimals = 3
const mostDecimals = 8

interface ShownResult {
  readonly text: string
  /** In the unit, as rounded in the text. */
  readonly value: number
  /** The most by which the text may be off. */
  readonly rounding: number
}

function shownResult(result: number, kind: Kind, unit: Unit, { denominator = 8 }: LengthFormat): ShownResult {
  if (kind === 'length') {
    const step = unit === 'in' ? millimetresPer.in / denominator : 1
    const perUnit = millimetresPer[unit]
    const text = lengthDigits(result, unit, { denominator })
    return { text, value: roundToTape(result, step) / perUnit, rounding: step / 2 / perUnit }
  }
  const decimals = kind === 'angle' ? 1 : 4
  const text = `${shownNumber(result, decimals)}${kind === 'angle' ? '°' : ''}`
  return { text, value: Number(result.toFixed(decimals)), rounding: 0.5 / 10 ** decimals }
}

export interface Explanation extends LengthFormat {
  /** What the result measures; a length by default. */
  readonly measures?: Kind
}

/**
 * The sum behind a rule, with every value filled in: '35 ÷ 6 + 1 1/2 ≈ 7 3/8'.
 *
 * All lengths are in the one unit. A value that is a whole number of sixteenths of an inch is written as a fraction, any
 * other with three decimals; when those would put the sum visibly off, all get more. So working the left side out by hand
 * gives the true result to a tenth of what the right side's rounding hides. '=' stands where the two sides as written are
 * equal, '≈' where the right one is rounded (to eighths of an inch or to the millimetre, as on a tag).
 * @param values by name, mm, degrees or bare
 * @param kinds what each name measures
 * @param result what the rule came to, mm; other than the sum itself when it was rounded to the tape
 * @throws DraftingError 'bad-formula' when the sum cannot be worked out
 */
export function explainFormula(
  formula: Formula,
  values: Values,
  kinds: Kinds,
  unit: Unit,
  result: number,
  { measures = 'length', ...format }: Explanation = {},
): string {
  const exact = evaluateFormula(formula, values) / (measures === 'length' ? millimetresPer[unit] : 1)
  const right = shownResult(result, measures, unit, format)
  let left = new ShownSum(values, kinds, unit, fewestDecimals).write(formula.root)
  for (let decimals = fewestDecimals + 1; decimals <= mostDecimals; decimals += 1) {
    if (Math.abs(left.value - exact) <= right.rounding / 10) break
    left = new ShownSum(values, kinds, unit, decimals).write(formula.root)
  }
  return `${left.text} ${Math.abs(left.value - right.value) < 1e-9 ? '=' : '≈'} ${right.text}`
}

import { evaluateArithmetic, type WorkedSum } from '../arithmetic'

/** Both sides of a sum; where nothing is to be worked out, a single number stands for both. */
export function sumOf(text: string): WorkedSum {
  return evaluateArithmetic(/[=≈]/.test(text) ? text : `${text} = ${text}`)
}

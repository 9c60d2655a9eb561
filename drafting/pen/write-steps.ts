import type { Step } from '../contract'
import { explainFormula } from '../rules'
import { lengthDigits } from '../lengths'
import type { Pen } from './pen'

/** Turns what the pen noted down into steps with words and sums. Without explanations the words and sums are left out. */
export function writeSteps(pen: Pen): Step[] {
  const { rules } = pen.values
  return pen.steps.map((record) => {
    const formula = record.by ? rules.formulas.get(record.by) : undefined
    const sum =
      pen.explains && record.by && record.length !== undefined
        ? formula
          ? explainFormula(formula, pen.values.numbers, rules.kinds, pen.unit, record.length)
          : lengthDigits(record.length, pen.unit)
        : undefined
    return {
      id: record.id,
      piece: record.piece,
      kind: record.kind,
      text: pen.explains ? record.say : '',
      ...(record.from ? { from: record.from } : {}),
      ...(record.direction ? { direction: record.direction } : {}),
      marks: record.marks,
      ...(record.edge ? { edge: record.edge } : {}),
      ...(formula ? { rule: record.by as string, formula: formula.text } : {}),
      ...(sum === undefined ? {} : { arithmetic: sum }),
      ...(record.length === undefined ? {} : { length: record.length }),
      ...(record.sagitta === undefined ? {} : { sagitta: record.sagitta }),
      uses: rules.names.spell(record.uses),
      draws: record.draws,
    }
  })
}

import type { Step } from '../contract'
import { explainFormula } from '../rules'
import { lengthDigits } from '../lengths'
import type { Pen } from './pen'

type Writable<T> = { -readonly [K in keyof T]: T[K] }

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
    const step: Writable<Partial<Step>> & Pick<Step, 'id' | 'piece' | 'kind' | 'text'> = {
      id: record.id,
      piece: record.piece,
      kind: record.kind,
      text: pen.explains ? record.say : '',
    }
    if (record.from) step.from = record.from
    if (record.direction) step.direction = record.direction
    step.marks = record.marks
    if (record.edge) step.edge = record.edge
    if (formula) {
      step.rule = record.by as string
      step.formula = formula.text
    }
    if (sum !== undefined) step.arithmetic = sum
    if (record.length !== undefined) step.length = record.length
    if (record.sagitta !== undefined) step.sagitta = record.sagitta
    step.uses = rules.names.spell(record.uses)
    step.draws = record.draws
    return step as Step
  })
}

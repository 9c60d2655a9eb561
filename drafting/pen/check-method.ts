import type { DraftOrder, MethodRule, Problem } from '../contract'
import { methodById, methods } from '../methods'
import type { Garment } from './garment'
import { isRecord } from './plain-data'

function isMethodRule(one: unknown): one is MethodRule {
  return isRecord(one) && typeof one.id === 'string' && typeof one.formula === 'string'
}

/**
 * The formulas of the method that an order follows, by rule; nothing for the garment's own rules. What is wrong with the
 * method goes into `problems`.
 */
export function checkMethod(
  garment: Garment,
  given: unknown,
  problems: Problem[],
): Readonly<Record<string, string>> | undefined {
  if (given === undefined) return undefined
  const refuse = (field: string, message: string): undefined => {
    problems.push({ field, code: 'unknown-field', message })
    return undefined
  }
  if (!isRecord(given) || typeof given.id !== 'string')
    return refuse('method', 'The drafting method is named by its id, such as freehand.')
  if (given.rules === undefined && !methodById(given.id)) {
    const known = methods.map(({ id }) => id).join(', ')
    return refuse(
      'method',
      `There is no drafting method “${given.id.slice(0, 60)}” here. Built in are ${known}; any other brings its rules along.`,
    )
  }
  const rules: unknown = given.rules ?? rulesOfMethod(garment, given.id)
  if (!Array.isArray(rules) || !rules.every(isMethodRule))
    return refuse('method.rules', 'The rules of a drafting method are a list of rules with their formulas.')
  const formulas: Record<string, string> = {}
  for (const { id, formula } of rules) {
    if (garment.definition.rules.some((rule) => rule.id === id)) formulas[id] = formula
    else
      refuse(
        `method.rules.${id.slice(0, 60)}`,
        `The drafting method has a rule “${id.slice(0, 60)}”, which this garment does not have.`,
      )
  }
  return formulas
}

function rulesOfMethod(garment: Garment, id: string): readonly MethodRule[] {
  return methodById(id)?.garments[garment.definition.id] ?? []
}

/** The formulas that replace the garment's own: the method's, and over them those of the order itself. */
export function formulasInForce(
  method: Readonly<Record<string, string>> | undefined,
  rules: DraftOrder['rules'],
): DraftOrder['rules'] {
  return method ? { ...method, ...rules } : rules
}

import type { Correction, DesignChoice, DraftOrder, GarmentDefinition, Problem, RemedyUse } from '../contract'
import { formatLength, roundToTape } from '../lengths'
import { isNumber, isRecord } from '../pen/plain-data'
import { changesFor, remedyById } from '.'
import type { Change, Remedy } from './remedy'

/** A remedy of an order, found good. */
interface Asked {
  readonly remedy: Remedy
  readonly amount: number
  readonly changes: readonly Change[]
}

/** The garment's formulas in force, by rule. */
type FormulaOf = (rule: string) => string | undefined

/**
 * Turns the remedies of an order into what they stand for: rules and style values raised, marks corrected. What is wrong with
 * them goes into `problems`, and is then left out.
 *
 * @param formulaOf the formula that a rule has without the remedies.
 * @returns the same order, without remedies, when it has none.
 */
export function applyRemedies(
  garment: GarmentDefinition,
  order: DraftOrder,
  formulaOf: FormulaOf,
  problems: Problem[],
): DraftOrder {
  const { remedies: given, ...plain } = order
  if (given === undefined) return order
  const asked = checkRemedies(garment, order, given, problems)
  if (asked.length === 0) return plain
  const raised = { ...plain, ...raise(garment, plain, asked, formulaOf, problems) }
  const moved = asked.flatMap((one) => moveMarks(one, order.tape))
  return moved.length > 0 ? { ...raised, corrections: [...moved, ...(plain.corrections ?? [])] } : raised
}

function checkRemedies(
  garment: GarmentDefinition,
  order: DraftOrder,
  given: unknown,
  problems: Problem[],
): readonly Asked[] {
  if (!Array.isArray(given)) {
    problems.push({ field: 'remedies', code: 'unknown-field', message: 'The fit remedies are a list.' })
    return []
  }
  const good: Asked[] = []
  given.forEach((one: unknown, index) => {
    const remedy = isRecord(one) ? remedyById(one.id) : undefined
    const field = `remedies.${remedy?.id ?? index}`
    const refuse = (
      code: Problem['code'],
      message: string,
      bounds: Pick<Problem, 'min' | 'max'> = {},
    ): void => {
      problems.push({ field, code, message, ...bounds })
    }
    if (!remedy) return refuse('unknown-field', 'This fit remedy is not known. Choose one from the list.')
    const { amount, off } = one as RemedyUse
    const changes = changesFor(remedy, garment)
    const { name, min, max, where } = remedy
    if (changes.length === 0)
      return refuse('unknown-field', `${name} is no remedy for the ${garment.name.toLowerCase()}.`)
    if (!isNumber(amount) || amount < min || amount > max) {
      const unit = order.unit === 'in' ? 'in' : 'cm'
      const range = `${formatLength(min, unit)} and ${formatLength(max, unit)}`
      return refuse('out-of-range', `${name} is mended by between ${range}.`, { min, max })
    }
    if (good.some((other) => other.remedy === remedy))
      return refuse('unknown-field', `${name} is there twice. Keep one, with the whole amount.`)
    if (off === true) return
    const style = where && isRecord(order.design) ? order.design[where.style] : undefined
    const chosen = where && (style ?? garment.design.find(({ id }) => id === where.style)?.default)
    if (where && chosen === where.not) return refuse('impossible-shape', where.message)
    good.push({ remedy, amount, changes })
  })
  return good
}

/** Hundredths are finer than any tape, and keep a formula readable. */
const rounded = (value: number): number => Math.round(value * 100) / 100

/** '(bust / 8 + 9.5cm) + 8 mm' */
function raisedFormula(formula: string, by: number, kind: 'length' | 'angle' | 'number'): string {
  const unit = { length: ' mm', angle: '°', number: '' }[kind]
  return `(${formula}) ${by < 0 ? '-' : '+'} ${Math.abs(by)}${unit}`
}

/** Rules and style values as all remedies together leave them. */
function raise(
  garment: GarmentDefinition,
  plain: DraftOrder,
  asked: readonly Asked[],
  formulaOf: FormulaOf,
  problems: Problem[],
): Pick<DraftOrder, 'rules' | 'design'> {
  const rules: Record<string, string> = { ...plain.rules }
  const design: Record<string, DesignChoice> = { ...plain.design }
  for (const { remedy, amount, changes } of asked) {
    for (const change of changes) {
      if ('rule' in change) {
        const kind = garment.rules.find(({ id }) => id === change.rule)?.kind ?? 'length'
        const formula = rules[change.rule] ?? formulaOf(change.rule)
        if (formula !== undefined)
          rules[change.rule] = raisedFormula(formula, rounded(amount * change.per), kind)
      } else if ('style' in change) {
        const value = garment.design.find(({ id }) => id === change.style)
        const now = design[change.style] ?? value?.default
        if (!value || typeof now !== 'number') continue
        const next = now + rounded(amount * change.per)
        if (next < (value.min ?? -Infinity) || next > (value.max ?? Infinity)) {
          const message = `${remedy.name}: ${value.name.toLowerCase()} would leave its range. Give the remedy less, or change that first.`
          problems.push({ field: `remedies.${remedy.id}`, code: 'out-of-range', message, min: remedy.min })
        } else design[change.style] = next
      }
    }
  }
  return { rules, design }
}

/** Marks moved. On a tape they go from one of its marks to another. */
function moveMarks({ remedy, amount, changes }: Asked, tape: unknown): Correction[] {
  const measured = (mm: number): number => (isNumber(tape) && tape > 0 ? roundToTape(mm, tape) : mm)
  return changes.flatMap((change) => {
    if (!('mark' in change)) return []
    const { piece, mark, per } = change
    const by = { x: measured(per.x * amount), y: measured(per.y * amount) }
    const note = remedy.name.toLowerCase()
    return [{ id: `${remedy.id}.${piece}.${mark}`, on: { piece, mark }, by, note }]
  })
}

import type { Correction, DesignChoice, DesignValue, DraftOrder, Problem } from '../contract'
import { completeCard, measurementById } from '../body'
import { formatLength } from '../lengths'
import { checkMethod, formulasInForce } from './check-method'
import { compileRules, type CompiledRules } from './compile'
import { offeredChoices, ruledOut } from '../combinations'
import type { Garment } from './garment'
import { isDrawn } from './design'
import { checkOwnMeasurements, ownValues } from './own-measurements'
import { isNumber, isRecord } from './plain-data'

/** An order that can be drafted, as far as can be told before drawing. */
export interface ReadyOrder {
  readonly measurements: Readonly<Record<string, number>>
  readonly estimatedBy: Readonly<Record<string, string>>
  readonly design: Readonly<Record<string, DesignChoice>>
  readonly rules: CompiledRules
  readonly corrections: readonly Correction[]
}

/**
 * Checks an order against its garment: every measurement, style value, formula and correction. Puts all that is wrong into
 * `problems`; answers undefined when there was anything.
 */
export function checkOrder(garment: Garment, order: DraftOrder, problems: Problem[]): ReadyOrder | undefined {
  const before = problems.length
  // A wrong unit is a problem of its own; the others are still said in one that people know.
  const unit = order.unit === 'in' ? 'in' : 'cm'
  const card = checkCard(garment, order.measurements, problems, unit)
  const design = checkDesign(garment, order.design, problems, unit)
  const named = problems.length
  const method = checkMethod(garment, order.method, problems)
  const own = checkOwnMeasurements(order.ownMeasurements, problems)
  checkRuleNames(garment, order.rules, problems)
  const rules =
    problems.length > named
      ? undefined
      : compileRules(garment, formulasInForce(method, order.rules), own, problems)
  const taken = ownValues(rules?.own ?? [], order.measurements, unit, problems)
  const corrections = checkCorrections(order.corrections, problems)
  checkManner(order, problems)
  if (problems.length > before || !card || !rules) return undefined
  const measurements = rules.own.length > 0 ? { ...card.measurements, ...taken } : card.measurements
  return { ...card, measurements, design, rules, corrections }
}

function checkCard(
  garment: Garment,
  given: unknown,
  problems: Problem[],
  unit: 'in' | 'cm',
): Pick<ReadyOrder, 'measurements' | 'estimatedBy'> | undefined {
  const { needs, estimates } = garment.definition
  const card: Record<string, number> = {}
  if (!isRecord(given)) {
    problems.push({
      field: 'measurements',
      code: 'missing-measurement',
      message: 'The order has no measurements. Give them in millimetres by their names.',
    })
    return undefined
  }
  let good = true
  for (const id of [...needs, ...estimates]) {
    if (!Object.hasOwn(given, id) || given[id] === undefined) continue
    const value = given[id]
    const definition = measurementById(id)
    const { min, max } = definition ?? { min: 0, max: Infinity }
    if (isNumber(value) && value >= min && value <= max) {
      card[id] = value
      continue
    }
    good = false
    problems.push({
      field: id,
      code: 'out-of-range',
      message: `${definition?.name ?? id} should lie between ${formatLength(min, unit)} and ${formatLength(max, unit)}. Measure again or check the unit.`,
      min,
      max,
    })
  }
  for (const id of needs) {
    if (Object.hasOwn(card, id) || (Object.hasOwn(given, id) && given[id] !== undefined)) continue
    good = false
    const definition = measurementById(id)
    problems.push({
      field: id,
      code: 'missing-measurement',
      message: `${definition?.name ?? id} is missing. ${definition?.how ?? 'Take it and put it on the card.'}`,
      ...(definition ? { min: definition.min, max: definition.max } : {}),
    })
  }
  if (!good) return undefined
  const completed = completeCard(card, estimates)
  return { measurements: completed.card, estimatedBy: completed.estimatedBy }
}

/** What is wrong with one style value, or nothing. */
function wrongChoice(
  value: DesignValue,
  given: unknown,
  unit: 'in' | 'cm',
): Omit<Problem, 'field'> | undefined {
  if (value.kind === 'yes-no') {
    return typeof given === 'boolean'
      ? undefined
      : { code: 'out-of-range', message: `${value.name} is either yes or no.` }
  }
  if (value.kind === 'choice') {
    return typeof given === 'string' && value.choices?.includes(given)
      ? undefined
      : { code: 'out-of-range', message: `${value.name} is one of ${value.choices?.join(', ')}.` }
  }
  const { min = -Infinity, max = Infinity } = value
  if (
    isNumber(given) &&
    given >= min &&
    given <= max &&
    (value.kind !== 'count' || Number.isInteger(given))
  ) {
    return undefined
  }
  const show = (number: number): string =>
    value.kind === 'length' ? formatLength(number, unit) : String(number)
  return {
    code: 'out-of-range',
    message: `${value.name} should ${value.kind === 'count' ? 'be a whole number' : 'lie'} between ${show(min)} and ${show(max)}.`,
    min,
    max,
  }
}

function checkDesign(
  garment: Garment,
  given: unknown,
  problems: Problem[],
  unit: 'in' | 'cm',
): Record<string, DesignChoice> {
  const design: Record<string, DesignChoice> = {}
  for (const value of garment.definition.design) design[value.id] = value.default
  if (given === undefined) {
    checkCombinations(garment, design, {}, problems)
    return design
  }
  if (!isRecord(given)) {
    problems.push({ field: 'design', code: 'unknown-field', message: 'The style is a list of named values.' })
    return design
  }
  for (const id of Object.keys(given)) {
    const value = garment.definition.design.find((one) => one.id === id)
    if (!value) {
      problems.push({
        field: id,
        code: 'unknown-field',
        message: `“${id.slice(0, 60)}” is no style value of this garment.`,
      })
      continue
    }
    if (given[id] === undefined) continue
    const wrong = wrongChoice(value, given[id], unit)
    if (!wrong) design[id] = given[id] as DesignChoice
    // A value that is not offered with the other choices is not drawn, so it cannot be wrong for this draft.
    else if (
      isDrawn(
        value,
        (other) => (isRecord(given) ? (given[other] as DesignChoice) : undefined) ?? design[other],
        garment.definition,
      )
    )
      problems.push({ field: id, ...wrong })
  }
  checkCombinations(garment, design, given, problems)
  return design
}

/** Refuses combinations that are not offered. What nobody chose gives way: a default is only a default. */
function checkCombinations(
  { definition }: Garment,
  design: Record<string, DesignChoice>,
  given: Readonly<Record<string, unknown>>,
  problems: Problem[],
): void {
  const chosen = (id: string): DesignChoice | undefined => design[id]
  for (const value of definition.design) {
    const now = design[value.id]
    const why = now === undefined ? undefined : ruledOut(definition.id, value.id, now, chosen)
    if (!why) continue
    const [first] = offeredChoices(definition.id, value, chosen)
    if (given[value.id] === undefined && first !== undefined) design[value.id] = first
    else if (isDrawn(value, chosen, definition)) {
      problems.push({ field: value.id, code: 'out-of-range', message: `${value.name}: ${why}` })
    }
  }
}

function checkRuleNames(garment: Garment, given: unknown, problems: Problem[]): void {
  if (given === undefined) return
  if (!isRecord(given)) {
    problems.push({
      field: 'rules.',
      code: 'unknown-field',
      message: 'The rules are a list of named formulas.',
    })
    return
  }
  for (const id of Object.keys(given)) {
    if (!garment.definition.rules.some((rule) => rule.id === id)) {
      problems.push({
        field: `rules.${id.slice(0, 60)}`,
        code: 'unknown-field',
        message: `“${id.slice(0, 60)}” is no rule of this garment.`,
      })
    } else if (typeof given[id] !== 'string') {
      problems.push({
        field: `rules.${id}`,
        code: 'unknown-field',
        message: `The rule “${id}” should be a formula such as “bust / 6 + 1.5in”.`,
      })
    }
  }
}

const isPoint = (value: unknown): boolean => isRecord(value) && isNumber(value.x) && isNumber(value.y)

/** No correction moves anything farther than this, mm: beyond it the body was measured wrong. */
const farthest = 150

function checkCorrections(given: unknown, problems: Problem[]): readonly Correction[] {
  if (given === undefined) return []
  if (!Array.isArray(given)) {
    problems.push({ field: 'corrections', code: 'unknown-field', message: 'The corrections are a list.' })
    return []
  }
  const good: Correction[] = []
  given.forEach((one: unknown, index) => {
    const field =
      isRecord(one) && typeof one.id === 'string'
        ? `corrections.${one.id.slice(0, 60)}`
        : `corrections.${index}`
    const on = isRecord(one) ? one.on : undefined
    const by = isRecord(one) ? one.by : undefined
    const onMark = isRecord(on) && typeof on.piece === 'string' && typeof on.mark === 'string'
    const onSeam = isRecord(on) && typeof on.seam === 'string' && isNumber(on.level)
    if (
      !isRecord(one) ||
      typeof one.id !== 'string' ||
      !(onMark || onSeam) ||
      (onMark ? !isPoint(by) : !isNumber(by))
    ) {
      problems.push({
        field,
        code: 'unknown-field',
        message:
          'A correction names a point and how far it moves, or a seam, a level and by how much it is taken in.',
      })
      return
    }
    const size = isNumber(by) ? Math.abs(by) : Math.hypot((by as { x: number }).x, (by as { y: number }).y)
    if (size > farthest) {
      problems.push({
        field,
        code: 'out-of-range',
        message:
          'A correction of more than 15 cm is no correction: change the measurement or the style instead.',
        max: farthest,
      })
      return
    }
    good.push(one as unknown as Correction)
  })
  return good
}

/** Nobody reads a tape finer than this, mm; marks without end would be looked for on one. */
const finestTape = 0.1

/** Unit, tape and the like. */
function checkManner(order: DraftOrder, problems: Problem[]): void {
  if (order.unit !== undefined && order.unit !== 'in' && order.unit !== 'cm') {
    problems.push({ field: 'unit', code: 'out-of-range', message: 'The unit is “in” or “cm”.' })
  }
  if (order.tape !== undefined && !(isNumber(order.tape) && order.tape >= finestTape && order.tape <= 12.7)) {
    problems.push({
      field: 'tape',
      code: 'out-of-range',
      message: 'The tape is read to some fraction: at least 0.1 mm and at most ½ in (12.7 mm).',
      min: finestTape,
      max: 12.7,
    })
  }
}

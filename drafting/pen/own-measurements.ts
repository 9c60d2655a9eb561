import type { OwnMeasurement, Problem, Unit } from '../contract'
import { formatLength } from '../lengths'
import { isOwnName } from '../own-names'
import { isNumber, isRecord } from './plain-data'

const mostOwn = 100

function wrong(one: unknown): string | undefined {
  if (!isRecord(one)) return 'An own measurement has a name, how it is taken, and its range.'
  if (!isOwnName(one.id))
    return 'The short name of an own measurement is two words or more joined by underscores, such as back_arc.'
  if (typeof one.name !== 'string' || one.name.trim() === '') return 'Name the own measurement.'
  if (typeof one.how !== 'string') return 'Say in one sentence how the own measurement is taken.'
  if (!isNumber(one.min) || !isNumber(one.max) || one.min < 0 || one.max <= one.min)
    return 'The range of an own measurement goes from a length to a larger one.'
  return undefined
}

/** The workroom's own measurements that an order brings along; what is wrong with them goes into `problems`. */
export function checkOwnMeasurements(given: unknown, problems: Problem[]): readonly OwnMeasurement[] {
  if (given === undefined) return []
  if (!Array.isArray(given) || given.length > mostOwn) {
    const message = `The own measurements are a list of at most ${mostOwn}.`
    problems.push({ field: 'ownMeasurements', code: 'unknown-field', message })
    return []
  }
  const good: OwnMeasurement[] = []
  given.forEach((one: unknown, index) => {
    const twice = isRecord(one) && good.some(({ id }) => id === one.id)
    const message = twice ? 'Two own measurements have the same short name.' : wrong(one)
    if (message) problems.push({ field: `ownMeasurements.${index}`, code: 'unknown-field', message })
    else good.push(one as OwnMeasurement)
  })
  return good
}

/**
 * The values of those own measurements that a formula uses; one that is missing or outside its range goes into `problems`.
 * @returns mm by id
 */
export function ownValues(
  used: readonly OwnMeasurement[],
  card: unknown,
  unit: Unit,
  problems: Problem[],
): Readonly<Record<string, number>> {
  const values: Record<string, number> = {}
  for (const { id, name, how, min, max } of used) {
    const value = isRecord(card) && Object.hasOwn(card, id) ? card[id] : undefined
    if (isNumber(value) && value >= min && value <= max) {
      values[id] = value
      continue
    }
    const range = { field: id, min, max }
    if (value === undefined) {
      const message = `${name} is missing, and a rule of this draft uses it. ${how}`.trim()
      problems.push({ ...range, code: 'missing-measurement', message })
    } else {
      const message = `${name} should lie between ${formatLength(min, unit)} and ${formatLength(max, unit)}. Measure again or check the unit.`
      problems.push({ ...range, code: 'out-of-range', message })
    }
  }
  return values
}

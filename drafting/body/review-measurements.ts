import type { Caution, Unit } from '../contract'
import { formatLength } from '../lengths'
import { valueOn, type Card } from './card'
import { concerns, misfits, type Misfit } from './misfits'
import { measurementById, measurements } from './measurements'
import { findSlips, type Slip } from './slips'

function nameOf(id: string): string {
  return measurementById(id)?.name ?? id
}

function figure(mm: number): string {
  return String(Math.round(mm * 100) / 100)
}

function slipInWords({ kind, typed, meant }: Slip, unit: Unit): string {
  switch (kind) {
    case 'inch-as-centimetre':
      return `If ${figure(typed / 10)} was meant in inches, that is ${formatLength(meant, unit)}.`
    case 'centimetre-as-inch':
      return `If ${figure(typed / 25.4)} was meant in centimetres, that is ${formatLength(meant, unit)}.`
    case 'half-girth':
      return `If the tape was doubled and this is half the girth, the whole is ${formatLength(meant, unit)}.`
    case 'half-width':
      return `If this is half the width, the whole is ${formatLength(meant, unit)}.`
  }
}

function slipCaution(slips: readonly Slip[], unit: Unit): readonly Caution[] {
  const [likeliest] = slips
  if (!likeliest) return []
  const { measurement, kind, typed } = likeliest
  const { min = 0, max = Infinity } = measurementById(measurement) ?? {}
  const possible = typed >= min && typed <= max
  const size = typed < min ? 'small' : 'large'
  const why = possible ? 'does not go with the rest of this card' : `is too ${size} for a grown-up body`
  const doubt = `${nameOf(measurement)} ${formatLength(typed, unit)} ${why}.`
  const guesses = slips.map((slip) => slipInWords(slip, unit)).join(' ')
  return [{ code: kind, message: `${doubt} ${guesses}`, fields: [measurement] }]
}

function rangeCaution(id: string, mm: number, unit: Unit): readonly Caution[] {
  const { min = 0, max = Infinity } = measurementById(id) ?? {}
  if (mm >= min && mm <= max) return []
  const message = `${nameOf(id)} ${formatLength(mm, unit)} is outside what can be drafted, ${formatLength(min, unit)} to ${formatLength(max, unit)}: measure it again.`
  return [{ code: 'out-of-range', message, fields: [id] }]
}

function misfitCaution(card: Card, { relation, value, low, high }: Misfit, unit: Unit): Caution {
  const { id, judged, by } = relation
  const others = by.map(
    (other) => `${nameOf(other).toLowerCase()} ${formatLength(valueOn(card, other) ?? 0, unit)}`,
  )
  const beside = others.length === 0 ? '' : ` for ${others.join(' and ')}`
  const odd = value < low ? 'small' : 'large'
  const usual = `${formatLength(Math.max(low, 0), unit)} to ${formatLength(high, unit)} is usual`
  const again = by.length === 0 ? 'measure it again' : 'measure both again'
  const message = `${nameOf(judged)} ${formatLength(value, unit)} is ${odd}${beside}: ${usual}. If it surprises you, ${again}.`
  return { code: id, message, fields: [judged, ...by] }
}

/** One measurement at odds with several others is the one to doubt: said once instead of each time. */
function oddOneOut(card: Card, odd: readonly Misfit[], unit: Unit): readonly Caution[] {
  const counts = measurements.map(({ id }) => ({ id, against: odd.filter((misfit) => concerns(misfit, id)) }))
  const worst = counts.reduce((most, one) => (one.against.length > most.against.length ? one : most))
  if (worst.against.length < 3) return odd.map((misfit) => misfitCaution(card, misfit, unit))
  const others = [
    ...new Set(worst.against.flatMap(({ relation }) => [relation.judged, ...relation.by])),
  ].filter((id) => id !== worst.id)
  const names = others.map((id) => nameOf(id).toLowerCase()).join(', ')
  const message = `${nameOf(worst.id)} ${formatLength(valueOn(card, worst.id) ?? 0, unit)} goes with none of these: ${names}. Measure it again first.`
  const rest = odd.filter((misfit) => !concerns(misfit, worst.id))
  return [
    { code: 'odd-one-out', message, fields: [worst.id, ...others] },
    ...rest.map((misfit) => misfitCaution(card, misfit, unit)),
  ]
}

function byFirstField(a: Caution, b: Caution): number {
  const place = ({ fields }: Caution) => measurements.findIndex(({ id }) => id === fields[0])
  return place(a) - place(b)
}

/**
 * Cautions about a measure card: values that are possible but odd against each other, impossible ones, and the slip that
 * explains them where there is one (inches typed as centimetres, the reverse, a doubled tape). A value with a slip is not
 * judged a second time.
 * @param card mm by measurement id; ids that are not ours and values that are no numbers are passed over
 * @param unit that the messages are written in
 * @returns in body order; empty when all is plausible
 */
export function reviewMeasurements(card: Card, unit: Unit = 'cm'): readonly Caution[] {
  const known = Object.fromEntries(
    measurements
      .map(({ id }) => [id, valueOn(card, id)])
      .filter((entry): entry is [string, number] => entry[1] !== undefined),
  )
  const plausible = Object.entries(known).every(([id, mm]) => rangeCaution(id, mm, unit).length === 0)
  if (plausible && misfits(known).length === 0) return []
  const slips = findSlips(known)
  const slipped = new Set(slips.map(([first]) => first?.measurement ?? ''))
  const rest = Object.fromEntries(Object.entries(known).filter(([id]) => !slipped.has(id)))
  const outOfRange = Object.entries(rest).flatMap(([id, mm]) => rangeCaution(id, mm, unit))
  const impossible = outOfRange.flatMap(({ fields }) => fields)
  const odd = misfits(rest).filter((misfit) => !impossible.some((id) => concerns(misfit, id)))
  return [
    ...slips.flatMap((one) => slipCaution(one, unit)),
    ...outOfRange,
    ...oddOneOut(rest, odd, unit),
  ].sort(byFirstField)
}

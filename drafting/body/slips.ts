import { valueOn, type Card } from './card'
import { estimates } from './estimates'
import { concerns, misfits, relationOn } from './misfits'
import { measurementById, measurements } from './measurements'
import { relations } from './relations'
import type { TapeMeasurement } from './tape-measurement'

export type SlipKind = 'inch-as-centimetre' | 'centimetre-as-inch' | 'half-girth' | 'half-width'

/** A value that a common slip explains, and what it should then be. */
export interface Slip {
  readonly measurement: string
  readonly kind: SlipKind
  /** mm, as it stands on the card. */
  readonly typed: number
  /** mm, with the slip undone. */
  readonly meant: number
}

const factors: Readonly<Record<SlipKind, number>> = {
  'inch-as-centimetre': 2.54,
  'centimetre-as-inch': 1 / 2.54,
  'half-girth': 2,
  'half-width': 2,
}

const unitSlips = ['inch-as-centimetre', 'centimetre-as-inch'] as const

/** Lengths are never halved; girths (tape doubled) and widths (half a back) are. */
function kindsFor({ kind }: TapeMeasurement): readonly SlipKind[] {
  return kind === 'length' ? unitSlips : [...unitSlips, kind === 'girth' ? 'half-girth' : 'half-width']
}

function inRange(id: string, mm: number): boolean {
  const { min = 0, max = Infinity } = measurementById(id) ?? {}
  return mm >= min && mm <= max
}

/** The card without the values that nobody can have: they are no evidence about the others. */
function trusted(card: Card): Card {
  return Object.fromEntries(Object.entries(card).filter(([id, mm]) => inRange(id, mm)))
}

function misfitCount(card: Card, id: string): number {
  return misfits(card).filter((misfit) => concerns(misfit, id)).length
}

/** How far a value is from what the rest of the card leads one to expect; undefined when it says nothing. */
function strangeness(card: Card, id: string): number | undefined {
  const value = valueOn(card, id) ?? 0
  const rule = Object.hasOwn(estimates, id) ? estimates[id] : undefined
  if (rule && rule.uses.length > 0 && rule.uses.every((used) => valueOn(card, used) !== undefined))
    return Math.abs(Math.log(value / rule.estimate(card)))
  const standing = relations
    .filter((relation) => relation.judged === id || relation.by.includes(id))
    .map((relation) => relationOn(card, relation))
    .filter((found) => found !== undefined)
    .map(({ value: judged, low, high }) => Math.abs(judged - (low + high) / 2) / (high - low))
  return standing.length === 0 ? undefined : Math.max(...standing)
}

/** The slips that would make one value possible and let it go with all the others; the likeliest first. */
function slipsOf(card: Card, measurement: TapeMeasurement): readonly Slip[] {
  const { id } = measurement
  const typed = valueOn(card, id) ?? 0
  const rest = trusted(card)
  return kindsFor(measurement)
    .map((kind) => ({ measurement: id, kind, typed, meant: typed * factors[kind] }))
    .filter(({ meant }) => inRange(id, meant) && misfitCount({ ...rest, [id]: meant }, id) === 0)
    .map((slip) => ({ slip, strange: strangeness({ ...rest, [id]: slip.meant }, id) ?? 0 }))
    .sort((a, b) => a.strange - b.strange)
    .map(({ slip }) => slip)
}

/** Measurements in doubt, those that fit the least first: impossible values, then those at odds with two others or more. */
function suspects(card: Card): readonly TapeMeasurement[] {
  const odd = misfits(trusted(card))
  return measurements
    .filter(({ id }) => valueOn(card, id) !== undefined)
    .map((measurement) => {
      const { id } = measurement
      const impossible = !inRange(id, valueOn(card, id) ?? 0)
      return {
        measurement,
        doubt: impossible ? Infinity : odd.filter((misfit) => concerns(misfit, id)).length,
      }
    })
    .filter(({ doubt }) => doubt > 1)
    .sort((a, b) => (a.doubt === b.doubt ? 0 : b.doubt - a.doubt))
    .map(({ measurement }) => measurement)
}

/** The unit slip that explains every impossible value of a card at once, when there are several. */
function sharedSlip(card: Card): readonly Slip[] {
  const impossible = Object.entries(card).filter(([id, mm]) => !inRange(id, mm))
  if (impossible.length < 2) return []
  const kind = unitSlips.find((unit) => impossible.every(([id, mm]) => inRange(id, mm * factors[unit])))
  if (!kind) return []
  return impossible.map(([measurement, typed]) => ({
    measurement,
    kind,
    typed,
    meant: typed * factors[kind],
  }))
}

/**
 * Values that look like an inch figure typed as centimetres, the reverse, or a tape that was doubled. A value is named only
 * when undoing the slip makes it possible and lets it go with everything else on the card (one odd pair alone does not
 * say which of the two is wrong); when several values are impossible
 * and one slip of unit explains them all, that is it.
 * @param card mm, our own measurements only
 * @returns for each such measurement its slips, the likeliest first
 */
export function findSlips(card: Card): readonly (readonly Slip[])[] {
  const shared = sharedSlip(card)
  const found: (readonly Slip[])[] = shared.map((slip) => [slip])
  let mended: Card = {
    ...card,
    ...Object.fromEntries(shared.map(({ measurement, meant }) => [measurement, meant])),
  }
  for (const measurement of suspects(mended)) {
    const { id } = measurement
    const fits = inRange(id, valueOn(mended, id) ?? 0) && misfitCount(trusted(mended), id) === 0
    const slips = fits ? [] : slipsOf(mended, measurement)
    const likeliest = slips[0]
    if (!likeliest) continue
    found.push(slips)
    mended = { ...mended, [id]: likeliest.meant }
  }
  return found
}

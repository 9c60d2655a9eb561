import { DraftingError } from '@/drafting/drafting-error'
import { completeCard, estimates, measurementById, reviewMeasurements } from '@/drafting/body'
import { formatLength, lengthDigits, parseLength } from '@/drafting/lengths'
import { plainText } from '@/components/ui/typed-fractions'

export type Unit = 'in' | 'cm'

/** A length as it is kept: what was typed stays what was typed. */
export interface Kept {
  readonly mm: number
  readonly typed: string
  readonly unit: Unit
}

/** One field of a card while it is open: what is kept, and what stands in it when that cannot be read. */
export interface OpenValue {
  readonly kept?: Kept
  readonly refused?: { readonly text: string; readonly message: string }
}

export type OpenValues = Readonly<Record<string, OpenValue>>

/** What a field shows: the refused text, else what was typed in this unit, else the length worked out in it. */
export function fieldText({ kept, refused }: OpenValue, unit: Unit): string {
  if (refused) return refused.text
  if (!kept) return ''
  return kept.unit === unit ? kept.typed : lengthDigits(kept.mm, unit)
}

/** Reads what was typed in the field of a measurement. Nothing at all empties it; what cannot be read keeps the last good value. */
export function readValue(id: string, text: string, unit: Unit, before: OpenValue): OpenValue {
  const typed = plainText(text).trim()
  if (typed === '') return {}
  try {
    const mm = Math.round(parseLength(typed, unit) * 1000) / 1000
    const measurement = measurementById(id)
    if (measurement && (mm < measurement.min || mm > measurement.max)) {
      const range = `${formatLength(measurement.min, unit)} to ${formatLength(measurement.max, unit)}`
      return {
        ...before,
        refused: { text, message: `${measurement.name} is from ${range}: measure it again.` },
      }
    }
    return { kept: { mm, typed: typed.slice(0, 40), unit } }
  } catch (error) {
    if (error instanceof DraftingError) return { ...before, refused: { text, message: error.message } }
    throw error
  }
}

/** Measurements by id, mm. */
export function lengthsOf(values: OpenValues): Readonly<Record<string, number>> {
  return Object.fromEntries(
    Object.entries(values).flatMap(([id, { kept }]) => (kept ? [[id, kept.mm] as const] : [])),
  )
}

/** Why a measurement is odd against the others, at the measurement that is to be looked at first. */
export function cautionsByField(values: OpenValues, unit: Unit): Readonly<Record<string, string>> {
  const cautions = reviewMeasurements(lengthsOf(values), unit)
  return Object.fromEntries([...cautions].reverse().map(({ fields, message }) => [fields[0] ?? '', message]))
}

/** What a draft would go by for the measurements nobody took: '≈ 14 1/4 in, neck base from bust'. */
export function estimatesByField(values: OpenValues, unit: Unit): Readonly<Record<string, string>> {
  const { card, estimatedBy } = completeCard(lengthsOf(values))
  const byRule = Object.values(estimates)
  return Object.fromEntries(
    Object.entries(estimatedBy).map(([id, rule]) => {
      const name = byRule.find((each) => each.id === rule)?.name.toLowerCase() ?? rule
      return [id, `≈ ${formatLength(card[id] ?? 0, unit)}, ${name}`]
    }),
  )
}

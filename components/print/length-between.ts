import { DraftingError } from '@/drafting/drafting-error'
import { formatLength, parseLength } from '@/drafting/lengths'

/** Reads a length within bounds, mm; without a unit it is in centimetres. */
export function lengthBetween(
  typed: string,
  least: number,
  most: number,
): { readonly mm?: number; readonly problem?: string } {
  try {
    const mm = Math.round(parseLength(typed, 'cm') * 100) / 100
    if (mm >= least && mm <= most) return { mm }
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error
    return { problem: error.problems[0]?.message }
  }
  return { problem: `This is ${formatLength(least, 'cm')} to ${formatLength(most, 'cm')}.` }
}

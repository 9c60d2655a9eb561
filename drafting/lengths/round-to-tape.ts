import { DraftingError } from '../drafting-error'
import { roundHalfAway } from './fractions'

/**
 * The nearest mark of a tape: what a length becomes when it is chalked straight on the cloth.
 * @param mm the length
 * @param tape distance between two marks of the tape, mm: 3.175 for eighths of an inch
 * @returns a multiple of `tape`, halves away from zero
 * @throws DraftingError 'out-of-range' when the tape has no such marks
 */
export function roundToTape(mm: number, tape: number): number {
  if (!(tape > 0 && Number.isFinite(tape)))
    throw new DraftingError([
      {
        field: 'tape',
        code: 'out-of-range',
        message: 'The marks of a tape are some millimetres apart, such as 1 or 3.175 (an eighth of an inch).',
      },
    ])
  return roundHalfAway(mm / tape) * tape
}

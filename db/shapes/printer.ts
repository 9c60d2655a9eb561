import * as z from 'zod'
import { idShape, requiredLine } from './ids'

/** What a printer made of 100 mm. Further off, a page was made to fit, and correcting it would hide that. */
const measured = z
  .number('Say what the square measured, in millimetres.')
  .min(95, 'At least 95 mm: less means that the page was made to fit.')
  .max(105, 'At most 105 mm: more means that the page was made to fit.')

export const printerShape = z.strictObject({
  id: idShape,
  name: requiredLine(60, 'the name of the printer'),
  /** mm of 100, across the paper's short side. */
  short: measured,
  /** mm of 100, along its long side. */
  long: measured,
})
export type PrinterInput = z.input<typeof printerShape>

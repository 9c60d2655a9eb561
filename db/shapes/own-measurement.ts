import * as z from 'zod'
import { isOwnName } from '../../drafting/own-names'
import { idShape, line, requiredLine } from './ids'
import { lengthShape } from './length'
import { versionShape } from './method'

const details = {
  id: idShape,
  name: requiredLine(120, 'a name for the measurement'),
  how: line(500, 'how it is taken').refine((how) => how !== '', 'Say in one sentence how it is taken.'),
  place: z.int('Its place is a whole number from 0.').min(0).max(1000),
  least: lengthShape,
  most: lengthShape,
}

/** Two measurements that a tape can tell apart are needed, or nothing could ever be typed. */
const orderly = {
  check: ({ least, most }: { least: { mm: number }; most: { mm: number } }) => most.mm >= least.mm + 10,
  problem: { path: ['most'], message: 'The largest is at least 1 cm more than the smallest.' },
}

export const ownMeasurementShape = z
  .strictObject({
    ...details,
    measurement: z
      .string()
      .refine(isOwnName, 'Two words or more in small letters, joined by underscores, such as back_arc.'),
  })
  .refine(orderly.check, orderly.problem)
export type OwnMeasurementInput = z.input<typeof ownMeasurementShape>

/** What formulas and cards call a measurement stays; the rest may change. */
export const ownMeasurementChangeShape = z
  .strictObject({ ...details, version: versionShape })
  .refine(orderly.check, orderly.problem)
export type OwnMeasurementChange = z.input<typeof ownMeasurementChangeShape>

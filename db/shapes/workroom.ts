import * as z from 'zod'
import { lines, requiredLine } from './ids'
import { lengthShape, unitShape } from './length'

/** Allowances that new drafts start from, by where they stand. */
export const allowanceNames = {
  shoulder: 'Shoulder',
  side: 'Side seam',
  centreBack: 'Centre back and zip',
  neckline: 'Neckline',
  armhole: 'Armhole',
  hem: 'Hem',
} as const
export type AllowanceId = keyof typeof allowanceNames

const allowance = lengthShape.refine((length) => length.mm <= 150, 'At most 15 cm (6 in).')
const allowancesShape = z.strictObject({
  shoulder: allowance,
  side: allowance,
  centreBack: allowance,
  neckline: allowance,
  armhole: allowance,
  hem: allowance,
})
export type Allowances = z.output<typeof allowancesShape>

/** Common practice, no published source: shoulder ½ in, side and zip 1 in, neckline and armhole 1 cm, hem 1 in. */
export const usualAllowances: Allowances = {
  shoulder: { mm: 12.7, typed: '1/2', unit: 'in' },
  side: { mm: 25.4, typed: '1', unit: 'in' },
  centreBack: { mm: 25.4, typed: '1', unit: 'in' },
  neckline: { mm: 10, typed: '1', unit: 'cm' },
  armhole: { mm: 10, typed: '1', unit: 'cm' },
  hem: { mm: 25.4, typed: '1', unit: 'in' },
}

const knownZones = new Set([...Intl.supportedValuesOf('timeZone'), 'UTC'])
const knownCurrencies = new Set(Intl.supportedValuesOf('currency'))

export const timeZoneShape = z
  .string('Choose a time zone.')
  .refine((zone) => knownZones.has(zone), 'Choose a time zone such as Africa/Lagos.')

/** What an owner may change about the workroom. */
export const workroomShape = z.strictObject({
  name: requiredLine(120, 'the name of the workroom'),
  note: lines(500),
  unit: unitShape,
  currency: z
    .string('Choose a currency.')
    .refine((code) => knownCurrencies.has(code), 'Choose a currency by its three letters, such as EUR.'),
  timeZone: timeZoneShape,
  allowances: allowancesShape,
})
export type WorkroomSettings = z.output<typeof workroomShape>

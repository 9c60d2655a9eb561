import * as z from 'zod'

export const units = ['in', 'cm'] as const
export const unitShape = z.enum(units, 'The unit is inches or centimetres.')
export type Unit = z.output<typeof unitShape>

/** A length as it is kept: millimetres, what was typed, and the unit it was typed in. */
export const lengthShape = z.strictObject({
  mm: z
    .number('Write a length such as 36 1/2.')
    .min(0, 'A length is not negative.')
    .max(100_000, 'At most 100 m.')
    .transform((mm) => Math.round(mm * 1000) / 1000),
  typed: z.string().trim().min(1, 'Write a length such as 36 1/2.').max(40, 'At most 40 characters.'),
  unit: unitShape,
})
export type Length = z.output<typeof lengthShape>

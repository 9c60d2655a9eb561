import * as z from 'zod'
import type { DraftOrder } from '../../drafting/contract'
import { unitShape } from './length'
import { methodRuleShape } from './method'

const name = z.string().regex(/^[a-zA-Z][a-zA-Z0-9-]{0,59}$/, 'This field is not known.')
const millimetres = z.number('Write a length such as 36 1/2.').min(-100_000).max(100_000)
const choice = z.union([millimetres, z.string().max(60), z.boolean()], 'This choice is not known.')
const few = <T extends Record<string, unknown>>(values: T) => Object.keys(values).length <= 200

const correction = z.strictObject({
  id: z.string().min(1).max(60),
  on: z.union([
    z.strictObject({ piece: z.string().max(60), mark: z.string().max(60) }),
    z.strictObject({ seam: z.string().max(60), level: millimetres }),
  ]),
  by: z.union([z.strictObject({ x: millimetres, y: millimetres }), millimetres]),
  off: z.boolean().optional(),
  note: z.string().max(500).optional(),
})

const remedy = z.strictObject({
  id: z.string().max(60),
  amount: millimetres,
  off: z.boolean().optional(),
})

const measurement = z.string().regex(/^[a-zA-Z][a-zA-Z0-9_]{0,59}$/, 'This measurement is not known.')

const method = z.strictObject({
  id: z.string().min(1).max(60),
  name: z.string().max(120).optional(),
  version: z.number().int().min(1).optional(),
  rules: z.array(methodRuleShape).max(200).readonly().optional(),
})

const ownMeasurement = z.strictObject({
  id: measurement,
  name: z.string().max(120),
  how: z.string().max(500),
  min: millimetres,
  max: millimetres,
})

/**
 * An order as it may be stored: well formed and of a sensible size. Whether it can be drafted is for the engine to say;
 * an order that cannot be drafted yet is saved all the same, so that nothing typed is lost.
 */
export const orderShape = z.strictObject({
  garment: name,
  measurements: z.record(measurement, millimetres).refine(few, 'At most 200 measurements.'),
  design: z.record(name, choice).refine(few, 'At most 200 choices.').optional(),
  rules: z.record(name, z.string().max(500)).refine(few, 'At most 200 rules.').optional(),
  method: method.optional(),
  ownMeasurements: z.array(ownMeasurement).max(100).readonly().optional(),
  corrections: z.array(correction).max(200).readonly().optional(),
  remedies: z.array(remedy).max(50).readonly().optional(),
  unit: unitShape.optional(),
  tape: z.number().min(0).max(100).optional(),
  explain: z.boolean().optional(),
}) satisfies z.ZodType<DraftOrder>

/** What stood in each field when it was saved: 36½ stays 36½. */
export const typedShape = z
  .record(z.string().regex(/^[a-zA-Z][a-zA-Z0-9._-]{0,79}$/), z.string().max(500))
  .refine(few, 'At most 200 fields.')

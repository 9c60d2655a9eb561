import * as z from 'zod'
import { idShape, line, lines, requiredLine } from './ids'

const name = z.string().regex(/^[a-zA-Z][a-zA-Z0-9-]{0,59}$/, 'This field is not known.')

/** A rule as a method has it, as it may be stored; what the formula says is for the engine to judge. */
export const methodRuleShape = z.strictObject({
  id: name,
  formula: z.string('Write a formula such as bust / 6 + 1.5 in.').max(500, 'At most 500 characters.'),
  source: line(300, 'where the rule comes from'),
})

const rules = z
  .array(methodRuleShape)
  .max(200, 'At most 200 rules for a garment.')
  .refine((list) => new Set(list.map(({ id }) => id)).size === list.length, 'Each rule once.')

const details = {
  id: idShape,
  name: requiredLine(120, 'a name for the method'),
  description: lines(2000),
  garments: z
    .record(name, rules)
    .refine((garments) => Object.keys(garments).length <= 60, 'At most 60 garments.'),
}

export const methodShape = z.strictObject(details)
export type MethodInput = z.input<typeof methodShape>

/** A change names the version it was made on. */
export const versionShape = z.int('Reload the page and try again.').min(1).max(4_000_000_000)

export const methodChangeShape = z.strictObject({ ...details, version: versionShape })
export type MethodChange = z.input<typeof methodChangeShape>

/** A workroom's copy of a built-in method, to be changed. */
export const methodCopyShape = z.strictObject({
  id: idShape,
  name: details.name,
  from: z.string('Choose a method from the list.').max(60),
})
export type MethodCopy = z.input<typeof methodCopyShape>

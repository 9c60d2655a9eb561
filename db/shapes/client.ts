import * as z from 'zod'
import { emailShape } from './email'
import { idShape, line, lines, pageShape, requiredLine, searchShape } from './ids'

const details = {
  name: requiredLine(120, 'the name of the client'),
  email: z.union(
    [z.literal(''), emailShape],
    'Write an e-mail address such as name@example.com, or nothing.',
  ),
  phone: line(40, 'a telephone number'),
  note: lines(5000),
}

export const clientShape = z.strictObject({ id: idShape, ...details })
export type ClientInput = z.input<typeof clientShape>

export const clientListShape = z.strictObject({
  search: searchShape,
  sort: z.enum(['name', 'updatedAt'], 'Sort by name or by last change.').default('name'),
  direction: z.enum(['asc', 'desc']).default('asc'),
  archived: z.boolean().default(false),
  page: pageShape,
})
export type ClientListInput = z.input<typeof clientListShape>

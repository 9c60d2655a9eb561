import type * as z from 'zod'
import { AccessError } from './access-error'

/**
 * The input as the shape describes it. Unknown keys are refused because the shapes are strict.
 * @throws AccessError invalid, with one problem a field.
 */
export function checkInput<S extends z.ZodType>(shape: S, input: unknown): z.output<S> {
  const result = shape.safeParse(input)
  if (result.success) return result.data
  const problems = result.error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => ({
          field: [...issue.path, key].join('.'),
          message: 'This field is not known.',
        }))
      : [{ field: issue.path.join('.'), message: issue.message }],
  )
  throw new AccessError('invalid', problems[0]?.message ?? 'Check what was entered.', problems.slice(0, 100))
}

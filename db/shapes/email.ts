import * as z from 'zod'

/** An e-mail address, trimmed and in lower case: the form in which it is kept and compared. */
export const emailShape = z
  .string('Write an e-mail address such as name@example.com.')
  .trim()
  .toLowerCase()
  .max(254, 'At most 254 characters.')
  .pipe(z.email('Write an e-mail address such as name@example.com.'))

import * as z from 'zod'

/** An id made by the client or by us; compared byte for byte, so one spelling only. */
export const idShape = z.uuid('This is not an id. Reload the page and try again.').toLowerCase()

/** One line of text, trimmed, without control characters. */
export function line(max: number, what: string) {
  return z
    .string(`Write ${what}.`)
    .trim()
    .max(max, `At most ${max} characters.`)
    .refine((value) => !/[\p{Cc}\u2028\u2029]/u.test(value), 'One line, without control characters.')
}

/** A line that may not be empty. */
export function requiredLine(max: number, what: string) {
  return line(max, what).refine((value) => value !== '', `Write ${what}.`)
}

/** Text of several lines. */
export function lines(max: number) {
  return z
    .string('Write text.')
    .trim()
    .max(max, `At most ${max} characters.`)
    .refine((value) => !/[^\P{Cc}\n\r\t]/u.test(value), 'Plain text, without control characters.')
}

/** A page of a list. */
export const pageShape = z.int('A page is a whole number from 1.').min(1).max(100_000).default(1)

/** Text to look for; what is typed is matched literally. */
export const searchShape = line(100, 'what to look for').default('')

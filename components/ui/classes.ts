/** Joins class names and leaves out what is absent. */
export function classes(...names: (string | false | undefined)[]): string {
  return names.filter(Boolean).join(' ')
}

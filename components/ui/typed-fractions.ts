const fractionSlash = '\u2044'
const hairSpace = '\u200a'
const thinSpace = '\u2009'

/** The fraction slash as it is typed: one character for one, so the caret stays where it is. */
export function typesetTyped(text: string): string {
  return text.replaceAll('/', fractionSlash)
}

/** Type set back to what a keyboard writes: for parsing, storing and comparing. */
export function plainText(text: string): string {
  return text.replaceAll(fractionSlash, '/').replaceAll(hairSpace, ' ').replaceAll(thinSpace, ' ')
}

const fractionSlash = '\u2044'
const hairSpace = '\u200a'
const thinSpace = '\u2009'

/**
 * Sets plain lengths as type: `36 1/2 in` → 36½ in. The font draws digits around U+2044 as a fraction; the whole number moves up to
 * it, the unit stands a thin space off. Works on any sentence or sum.
 */
export function typeset(text: string): string {
  return text
    .replace(/(\d)[ -](\d+)\/(\d+)/g, `$1${hairSpace}$2/$3`)
    .replace(/(\d)\/(\d)/g, `$1${fractionSlash}$2`)
    .replace(/(\d) (in|cm|mm|m)\b/g, `$1${thinSpace}$2`)
}

/** The fraction slash as it is typed: one character for one, so the caret stays where it is. */
export function typesetTyped(text: string): string {
  return text.replaceAll('/', fractionSlash)
}

/** Back to what a keyboard writes: for parsing, storing and comparing. */
export function plainText(text: string): string {
  return text.replaceAll(fractionSlash, '/').replaceAll(hairSpace, ' ').replaceAll(thinSpace, ' ')
}

/** U+2044; a font draws digits around it as a fraction. */
const fractionSlash = '\u2044'
const thinSpace = '\u2009'

/**
 * Sets the fractions of a text as type: '7 3/8 in' → '7\u20093⁄8 in'. The thin space keeps the whole number out of the numerator.
 * Only plain fractions of a tape are set (denominators 2 to 64); dates such as 12/1/2026 stay as they are.
 */
export function typesetFractions(text: string): string {
  return text.replace(
    /(?<![\d/.,])(\d+[ \u2009])?(\d{1,2})\/(2|3|4|6|8|16|32|64)(?![\d/])/g,
    (_, whole: string | undefined, above: string, below: string) =>
      `${whole ? whole.trim() + thinSpace : ''}${above}${fractionSlash}${below}`,
  )
}

/** 'centre-back' → 'Centre back'. */
export function wordsOf(id: string): string {
  const words = id.replaceAll('-', ' ')
  return words.charAt(0).toUpperCase() + words.slice(1)
}

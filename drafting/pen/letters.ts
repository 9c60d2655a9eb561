/** The letter of the nth mark of a piece: A…Z, then A1…Z1. */
export function letter(index: number): string {
  const round = Math.floor(index / 26)
  return String.fromCharCode(65 + (index % 26)) + (round ? String(round) : '')
}

/** One page of a list. */
export interface Listed<T> {
  readonly items: readonly T[]
  readonly total: number
  readonly page: number
  readonly pages: number
}

export const pageSize = 50

/** @param page counted from 1 */
export function pageWindow(page: number): { limit: number; offset: number } {
  return { limit: pageSize, offset: (page - 1) * pageSize }
}

export function listed<T>(items: readonly T[], total: number, page: number): Listed<T> {
  return { items, total, page, pages: Math.max(1, Math.ceil(total / pageSize)) }
}

/** A LIKE pattern that finds the text anywhere, its own % and _ meant literally. */
export function containing(text: string): string {
  return `%${text.replace(/[\\%_]/g, '\\$&')}%`
}

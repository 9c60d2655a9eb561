import type { Orientation, PaperId } from '@/drafting/drawing'

/** How a person wants the pattern on paper. */
export interface PrintChoices {
  readonly paper: PaperId
  readonly orientation: Orientation
  readonly allowances: boolean
}

export const firstChoices: PrintChoices = { paper: 'a4', orientation: 'fewest', allowances: true }

/**
 * Where the file of a pattern is fetched from.
 * @param base the address of the version or of the link: '/api/revisions/<id>' or '/api/shared/<token>'
 */
export function patternAddress(base: string, format: 'pdf' | 'svg', choices: PrintChoices): string {
  const query = new URLSearchParams({ allowances: choices.allowances ? 'yes' : 'no' })
  if (format === 'pdf') {
    query.set('paper', choices.paper)
    query.set('orientation', choices.orientation)
  }
  return `${base}/pattern.${format}?${query}`
}

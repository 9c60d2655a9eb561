import { rollWidths } from '@/drafting/drawing/papers'
import { trueMeasure } from '@/drafting/drawing/print-scale'
import type { Join, Measured, Orientation, PaperId, PrintScale } from '@/drafting/drawing'

/** How a person wants the pattern on paper. */
export interface PrintChoices {
  readonly paper: PaperId
  /** mm, of a roll. */
  readonly roll: number
  readonly orientation: Orientation
  readonly allowances: boolean
  readonly scale: PrintScale
  readonly join: Join
  /** mm that stay free along the edge of each sheet. */
  readonly margin: number
  readonly black: boolean
  readonly bold: boolean
  /** Ids of the pieces, or all. */
  readonly pieces?: readonly string[]
  /** What the printer makes of 100 mm. */
  readonly measured: Measured
  /** Of a version that was printed or shared before: as it was then, or as it is drawn today. */
  readonly drawing: 'kept' | 'today'
}

export const firstChoices: PrintChoices = {
  paper: 'a4',
  roll: rollWidths.usual,
  orientation: 'fewest',
  allowances: true,
  scale: 'full',
  join: 'trim',
  margin: 10,
  black: false,
  bold: false,
  measured: trueMeasure,
  drawing: 'kept',
}

/**
 * Where the file of a pattern is fetched from. What is as usual is not said.
 * @param base the address of the version or of the link: '/api/revisions/<id>' or '/api/shared/<token>'
 */
export function patternAddress(base: string, format: 'pdf' | 'svg', choices: PrintChoices): string {
  const query = new URLSearchParams({ allowances: choices.allowances ? 'yes' : 'no' })
  if (choices.drawing === 'today') query.set('drawing', 'today')
  if (format === 'pdf') {
    query.set('paper', choices.paper)
    query.set('orientation', choices.orientation)
    for (const [name, value] of unusual(choices)) query.set(name, value)
  }
  return `${base}/pattern.${format}?${query}`
}

function unusual(choices: PrintChoices): readonly (readonly [string, string])[] {
  const said: readonly (readonly [string, string | number, boolean])[] = [
    ['roll', choices.roll, choices.paper === 'roll'],
    ['scale', choices.scale, choices.scale !== firstChoices.scale],
    ['join', choices.join, choices.join !== firstChoices.join],
    ['margin', choices.margin, choices.margin !== firstChoices.margin],
    ['ink', 'black', choices.black],
    ['lines', 'bold', choices.bold],
    ['pieces', (choices.pieces ?? []).join(','), choices.pieces !== undefined],
    ['across', choices.measured.short, choices.measured.short !== 100],
    ['along', choices.measured.long, choices.measured.long !== 100],
  ]
  return said.filter(([, , needed]) => needed).map(([name, value]) => [name, String(value)])
}

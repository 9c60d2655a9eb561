/** Colour tokens of the look; each writer knows what they stand for on its page. */
export type Dye = 'ink' | 'indigo' | 'madder' | 'weld' | 'fern' | 'walnut'

export interface Style {
  readonly stroke?: Dye
  /** Line weight, mm on paper. */
  readonly width?: number
  /** Line weight, px on a screen, whatever the zoom. */
  readonly screenWidth?: number
  /** Lengths of dashes and gaps, mm on paper. */
  readonly dash?: readonly number[]
  readonly fill?: Dye
  readonly opacity?: number
  /** Of a text. All texts are centred on their place. */
  readonly weight?: 400 | 600
}

/** Heaviest is what the shears follow; meaning is carried by the dashes as well as by the colour. */
export const styles = {
  cut: { stroke: 'ink', width: 0.6, screenWidth: 2 },
  /** The outline of a nett pattern, which is cut along but carries no allowance. */
  nett: { stroke: 'ink', width: 0.6, screenWidth: 2 },
  stitch: { stroke: 'madder', width: 0.35, screenWidth: 1.25, dash: [4, 2.5] },
  turn: { stroke: 'madder', width: 0.3, screenWidth: 1.25, dash: [9, 3] },
  fold: { stroke: 'indigo', width: 0.45, screenWidth: 1.5, dash: [14, 2.5, 1.5, 2.5] },
  bracket: { stroke: 'indigo', width: 0.35, screenWidth: 1.25 },
  grain: { stroke: 'ink', width: 0.3, screenWidth: 1 },
  notch: { stroke: 'ink', width: 0.5, screenWidth: 1.75 },
  inner: { stroke: 'walnut', width: 0.25, screenWidth: 1, dash: [6, 2] },
  gather: { stroke: 'madder', width: 0.3, screenWidth: 1.25, dash: [1.2, 1.8] },
  construction: { stroke: 'walnut', width: 0.13, screenWidth: 0.75 },
  mark: { stroke: 'ink', width: 0.3, screenWidth: 1.25 },
  dimension: { stroke: 'walnut', width: 0.18, screenWidth: 0.75 },
  arrowhead: { fill: 'ink' },
  'fold-arrowhead': { fill: 'indigo' },
  'tint-indigo': { fill: 'indigo', opacity: 0.05 },
  'tint-madder': { fill: 'madder', opacity: 0.05 },
  'tint-weld': { fill: 'weld', opacity: 0.06 },
  'tint-fern': { fill: 'fern', opacity: 0.05 },
  'allowance-fill': { fill: 'walnut', opacity: 0.07 },
  // Sizes of a nest: told apart by their dashes first, then by their dye, and by the name beside each line.
  'size-1': { stroke: 'ink', width: 0.45, screenWidth: 1.5 },
  'size-2': { stroke: 'ink', width: 0.45, screenWidth: 1.5, dash: [8, 2] },
  'size-3': { stroke: 'ink', width: 0.45, screenWidth: 1.5, dash: [3, 2] },
  'size-4': { stroke: 'ink', width: 0.45, screenWidth: 1.5, dash: [8, 2, 1.5, 2] },
  'size-5': { stroke: 'indigo', width: 0.45, screenWidth: 1.5 },
  'size-6': { stroke: 'indigo', width: 0.45, screenWidth: 1.5, dash: [8, 2] },
  'size-7': { stroke: 'indigo', width: 0.45, screenWidth: 1.5, dash: [3, 2] },
  'size-8': { stroke: 'indigo', width: 0.45, screenWidth: 1.5, dash: [8, 2, 1.5, 2] },
  'size-9': { stroke: 'madder', width: 0.45, screenWidth: 1.5 },
  'size-10': { stroke: 'madder', width: 0.45, screenWidth: 1.5, dash: [8, 2] },
  'size-11': { stroke: 'madder', width: 0.45, screenWidth: 1.5, dash: [3, 2] },
  'size-12': { stroke: 'madder', width: 0.45, screenWidth: 1.5, dash: [8, 2, 1.5, 2] },
  'label-name': { fill: 'ink', weight: 600 },
  label: { fill: 'ink', weight: 400 },
  'label-small': { fill: 'walnut', weight: 400 },
  'mark-letter': { fill: 'ink', weight: 600 },
  'dimension-text': { fill: 'walnut', weight: 600 },
} as const satisfies Record<string, Style>

export type StyleName = keyof typeof styles

const table: Readonly<Record<string, Style>> = styles

/** The style of a drawing's item. @throws Error for a name that is not in the table: a mistake in the drawing, not in the data. */
export function styleOf(name: string): Style {
  const style = table[name]
  if (!style) throw new Error(`No style is called "${name}".`)
  return style
}

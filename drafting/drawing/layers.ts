/** The layers of a drawing, from the bottom up. Writers keep this order and give each layer its plain name. */
export const layers = [
  'fill',
  'allowance-fill',
  'construction',
  'inner',
  'grain',
  'stitch',
  'fold',
  'cut',
  'notch',
  'mark',
  'dimension',
  'label',
] as const

export type Layer = (typeof layers)[number]

/** What a finished pattern shows: everything but the drafter's own lines. */
export const patternLayers: readonly Layer[] = layers.filter(
  (layer) => layer !== 'construction' && layer !== 'dimension',
)

/** What is printed: the pattern in lines alone, as ink spent on fills says nothing. */
export const printLayers: readonly Layer[] = patternLayers.filter(
  (layer) => layer !== 'fill' && layer !== 'allowance-fill',
)

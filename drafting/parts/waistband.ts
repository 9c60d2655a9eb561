import type { DesignValue, RuleDefinition, Run } from '../contract'
import { length, yesNo } from '../pen/design'
import { lengthRule } from '../pen/garment'
import type { Pen, SeamPlan } from '../pen/pen'

const worn = { id: 'waistband', is: [true] }

export const waistbandDesign: readonly DesignValue[] = [
  yesNo('waistband', 'Waistband', 'waistband', true),
  length('waistbandDepth', 'Waistband, finished depth', 'waistband', { default: 35, min: 20, max: 50 }, worn),
  length('underlap', 'Underlap', 'waistband', { default: 30, min: 15, max: 50 }, worn),
  length('waistbandAllowance', 'Waistband allowance', 'allowances', { default: 12.7, min: 0, max: 25 }, worn),
]

/** The same for a skirt that cannot do without a band. */
export const bandAlways: readonly DesignValue[] = waistbandDesign
  .filter((value) => value.id !== 'waistband')
  .map(({ when: _when, ...value }) => value)

/** How much a skirt that is not gathered is eased into its band. */
export const waistEasedIn = length(
  'waistEasedIn',
  'Skirt eased into the band',
  'waistband',
  { default: 0, min: 0, max: 10 },
  worn,
)

export const waistbandRules: readonly RuleDefinition[] = [
  lengthRule('waistbandLength', 'Waistband without underlap', 'waistDrawn - waistEasedIn'),
  lengthRule('waistbandFold', 'Waistband, cut depth', 'waistbandDepth * 2'),
]

/**
 * A straight waistband, folded along its upper edge; the skirt is eased into it.
 *
 * @param runs the skirt's waist edges in order, beginning at the opening.
 * @param matches mm along skirt and band that must fall together: sides and centres.
 * @param gathered the rule that says how much is gathered in, where the skirt is gathered instead of eased.
 */
export function waistband(
  pen: Pen,
  runs: readonly Run[],
  matches: SeamPlan['matches'] = [],
  gathered?: string,
): void {
  const band = pen.piece(
    'waistband',
    'Waistband',
    'The band follows the waist: take in a seam there, or change its depth or underlap.',
  )
  band.start('end', { x: 0, y: 0 }, 'Mark the end of the band on a straight line')
  band.go('foldEnd', 'end', 'down', 'waistbandDepth', {
    say: 'Come down the finished depth: here the band folds',
  })
  band.go('lowEnd', 'end', 'down', 'waistbandFold', {
    say: 'Come down twice the finished depth',
    drag: ['waistbandDepth'],
  })
  band.go('meets', 'end', 'right', 'waistbandLength', {
    say: 'Go along as far as the waist of the skirt measures',
  })
  band.go('lapEnd', 'meets', 'right', 'underlap', { say: 'Go on by the underlap', drag: ['underlap'] })
  band.square('lowMeets', 'meets', 'lowEnd', { say: 'Square down to the lower edge' })
  band.square('lowLapEnd', 'lapEnd', 'lowEnd', { say: 'Square down to the lower edge' })
  pen.tag({ piece: 'waistband', from: 'end', to: 'meets', label: 'Waistband' })
  pen.tag({ piece: 'waistband', from: 'meets', to: 'lapEnd', label: 'Underlap', value: 'underlap' })
  pen.tag({ piece: 'waistband', from: 'end', to: 'foldEnd', label: 'Band depth', value: 'waistbandDepth' })
  const turned = { role: 'free', finish: 'turned', allowance: 'waistbandAllowance' } as const
  band.line('inner', 'end', 'lapEnd', { ...turned, say: 'The inner edge, turned in and felled down' })
  band.line('lap', 'lapEnd', 'lowLapEnd', { ...turned, say: 'The end of the underlap' })
  band.line('lower-lap', 'lowLapEnd', 'lowMeets', { ...turned, say: 'Under the lap nothing is sewn on' })
  band.line('lower', 'lowMeets', 'lowEnd', {
    role: 'waist',
    allowance: 'waistbandAllowance',
    say: 'The edge that the skirt is sewn to',
  })
  band.line('short-end', 'lowEnd', 'end', { ...turned, say: 'The end that meets the opening' })
  const fold = band.at('foldEnd')
  const end = { x: band.at('lapEnd').x, y: fold.y }
  band.inner(
    'fold',
    'turn',
    { closed: false, segments: [{ kind: 'line', from: fold, to: end }] },
    'Fold the band here',
    band.usesOf('foldEnd', 'lapEnd'),
    'line',
  )
  band.grain({ x: end.x * 0.3, y: fold.y * 0.5 }, { x: end.x * 0.6, y: fold.y * 0.5 })
  band.cut(
    { cloth: 'main', count: 1, onFold: false, handed: false },
    { cloth: 'interfacing', count: 1, onFold: false, handed: false },
  )
  pen.sew({
    id: 'waist',
    name: 'Skirt into waistband',
    a: runs,
    b: [{ piece: 'waistband', edge: 'lower' }],
    join: gathered ? 'gathered' : 'eased',
    easeFrom: gathered ?? 'waistEasedIn',
    matches,
  })
  pen.notion({ kind: 'hook', count: 1 })
}

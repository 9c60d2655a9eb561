import type { DesignValue, RuleDefinition } from '../../contract'
import { choice, length } from '../../pen/design'
import type { Pen } from '../../pen/pen'
import { chosenNeckline } from '../necklines'
import type { Collar } from './collar'
import { funnel } from './funnel'
import { mandarin, standDesign } from './mandarin'
import { peterPan, peterPanDesign } from './peter-pan'
import { shirt, shirtCollarDesign, shirtCollarRules } from './shirt'

/** The collars by their names in the style. */
const collars: Readonly<Record<string, Collar>> = { 'Peter Pan': peterPan, mandarin, shirt }

/** Offered with the necklines that take one: on any other a collar would stand off or break at a corner. */
export const collarDesign: readonly DesignValue[] = [
  choice('collar', 'Collar', 'collar', ['none', ...Object.keys(collars)], { id: 'neckShape', is: ['round'] }),
  ...peterPanDesign,
  ...standDesign,
  ...shirtCollarDesign,
  length(
    'collarAllowance',
    'Collar allowance',
    'allowances',
    { default: 7, min: 0, max: 12 },
    { id: 'collar', is: Object.keys(collars) },
  ),
  length(
    'funnelAllowance',
    'Funnel allowance',
    'allowances',
    { default: 7, min: 0, max: 12 },
    { id: 'neckShape', is: ['high'] },
  ),
]

export const collarRules: readonly RuleDefinition[] = shirtCollarRules

/** The collar of a style, if its neckline takes one and it has one. */
export function chosenCollar(pen: Pen): Collar | undefined {
  const takes = chosenNeckline(pen).takesCollar
  if (takes === 'funnel') return funnel
  return takes === 'any' ? collars[String(pen.offered('collar'))] : undefined
}

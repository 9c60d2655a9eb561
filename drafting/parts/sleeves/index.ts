import type { DesignValue, RuleDefinition } from '../../contract'
import { count, length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import { bell, bellDesign, bellRules } from './bell'
import { flared } from './flared'
import { plain } from './plain'
import { puff, puffDesign, puffRules } from './puff'
import type { SleeveKind } from './sleeve-kind'

/** The sleeves by their names in the style. */
const kinds: Readonly<Record<string, SleeveKind>> = { plain, flared, bell, puff }

const is = (...names: readonly string[]) => ({ id: 'sleeve', is: names })
const worn = is(...Object.keys(kinds))

export const sleeveDesign: readonly DesignValue[] = [
  length(
    'sleeveLength',
    'Sleeve length',
    'sleeve',
    { default: 350, min: 250, max: 700 },
    is('plain', 'flared'),
  ),
  length('sleeveEase', 'Ease round the arm', 'sleeve', { default: 50, min: 40, max: 120 }, worn),
  length('sleeveHeadEase', 'Ease of the sleeve head', 'sleeve', { default: 10, min: 0, max: 40 }, worn),
  length('sleeveTaper', 'Taper of each side', 'sleeve', { default: 15, min: 0, max: 40 }, is('plain')),
  count('sleeveCuts', 'Number of cuts', 'sleeve', { default: 4, min: 2, max: 8 }, is('flared')),
  length('sleeveSpread', 'Spread at each cut', 'sleeve', { default: 40, min: 5, max: 80 }, is('flared')),
  ...bellDesign,
  ...puffDesign,
  length('sleeveAllowance', 'Sleeve seam allowance', 'allowances', { default: 12.7, min: 0, max: 40 }, worn),
  length(
    'sleeveHemAllowance',
    'Sleeve hem',
    'allowances',
    { default: 20, min: 0, max: 50 },
    is('plain', 'flared', 'bell'),
  ),
]

export const sleeveRules: readonly RuleDefinition[] = [
  lengthRule('biceps', 'Sleeve girth at the underarm', 'upperArm + sleeveEase'),
  lengthRule('leastArmhole', 'Least armhole for the arm', '(upperArm + sleeveEase) * 1.1'),
  lengthRule('frontHeadEase', 'Ease in the front of the head', 'sleeveHeadEase * 0.45'),
  lengthRule('backHeadEase', 'Ease in the back of the head', 'sleeveHeadEase * 0.55'),
  ...bellRules,
  ...puffRules,
]

/** The kind of sleeve that a style asks for. Every kind that a garment offers is here. */
export function chosenSleeve(pen: Pen): SleeveKind {
  const kind = kinds[String(pen.chosen('sleeve'))]
  if (!kind) throw new Error('Every sleeve offered has its kind.')
  return kind
}

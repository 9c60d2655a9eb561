import type { DesignValue, RuleDefinition } from '../../contract'
import { angle, choice, length, share } from '../../pen/design'
import { lengthRule, type Garment } from '../../pen/garment'

/** The usual values of a kimono sleeve, which differ from a kaftan to a blouse. mm, degrees */
interface Usual {
  readonly slope: number
  readonly reach: number
  readonly mouth: number
  readonly lower: number
}

/** Style values of a sleeve that is cut in one with the body. */
export function kimonoDesign(usual: Usual, when?: DesignValue['when']): readonly DesignValue[] {
  return [
    angle(
      'overarmSlope',
      'Slope of shoulder and sleeve',
      'sleeve',
      { default: usual.slope, min: 5, max: 25 },
      when,
    ),
    share(
      'sleeveReach',
      'Sleeve, share of the arm',
      'sleeve',
      { default: usual.reach, min: 0.25, max: 1 },
      when,
    ),
    length(
      'mouthWidth',
      'Sleeve opening, laid flat',
      'sleeve',
      { default: usual.mouth, min: 150, max: 300 },
      when,
    ),
    length('underarmLower', 'Underarm lower by', 'sleeve', { default: usual.lower, min: 20, max: 120 }, when),
    length('kimonoEase', 'Ease round the arm', 'sleeve', { default: 80, min: 60, max: 160 }, when),
    length('underarmRound', 'Rounding under the arm', 'sleeve', { default: 80, min: 60, max: 110 }, when),
    choice('gusset', 'Gusset under the arm', 'sleeve', ['when it binds', 'always', 'never'], when),
    length('gussetSide', 'Side of the gusset', 'sleeve', { default: 90, min: 60, max: 110 }, when),
    length(
      'mouthAllowance',
      'Sleeve hem of the kimono',
      'allowances',
      { default: 20, min: 0, max: 40 },
      when,
    ),
  ]
}

/** Common practice, no published source. `kimonoQuarter`, `armholeDepth`, `halfShoulder` and `neckWidth` are the garment's. */
export const kimonoRules: readonly RuleDefinition[] = [
  lengthRule(
    'kimonoUnderarm',
    'Underarm, from the side neck',
    'armholeDepth + underarmLower + underarmDeepening',
  ),
  lengthRule('kimonoBiceps', 'Least girth of the sleeve under the arm', 'upperArm + kimonoEase'),
  lengthRule('kimonoSleeve', 'Sleeve from the shoulder', 'armLength * sleeveReach + sleeveLengthening'),
]

/** What drawing a kimono sleeve finds. */
export const kimonoFound: Garment['found'] = {
  underarmDeepening: 'length',
  sleeveLengthening: 'length',
  shoulderAlong: 'length',
  underarmDepth: 'length',
  sideDrop: 'length',
}

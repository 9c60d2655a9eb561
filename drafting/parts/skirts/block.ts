import type { DesignValue, RuleDefinition } from '../../contract'
import { choice, count, length } from '../../pen/design'
import { geometry, lengthRule } from '../../pen/garment'

const atCentreBack = { id: 'opening', is: ['centre-back zip'] }

/** Style values of a skirt that is fitted with darts between waist and hip. */
export const skirtBlockDesign: readonly DesignValue[] = [
  length('length', 'Length from the waist', 'skirt', { default: 600, min: 400, max: 1100 }),
  length('waistEase', 'Waist ease', 'skirt', { default: 15, min: 0, max: 60 }),
  length('hipEase', 'Hip ease', 'skirt', { default: 50, min: 20, max: 160 }),
  count('frontDarts', 'Front darts, each half', 'darts', { default: 1, min: 1, max: 2 }),
  count('backDarts', 'Back darts, each half', 'darts', { default: 2, min: 1, max: 2 }),
  choice('opening', 'Opening', 'opening', ['centre-back zip', 'side zip']),
  length('zipLength', 'Zip length', 'opening', { default: 200, min: 150, max: 250 }),
  length('waistAllowance', 'Waist allowance', 'allowances', { default: 10, min: 0, max: 20 }),
  length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 30 }),
  length(
    'centreBackAllowance',
    'Centre back allowance',
    'allowances',
    { default: 19, min: 0, max: 30 },
    atCentreBack,
  ),
]

/**
 * Rules of a skirt that is fitted with darts. Where the waist is as wide as the hip there is nothing to take out, and every
 * rule that shapes the side comes to nothing with it.
 */
export const skirtBlockRules: readonly RuleDefinition[] = [
  lengthRule('waistQuarter', 'Quarter of the waist', '(waist + waistEase) / 4', geometry),
  lengthRule('skirtQuarter', 'Quarter of the skirt', 'max((hip + hipEase) / 4, waistQuarter)'),
  lengthRule('hipLine', 'Hip below the waist', 'waistToHip'),
  lengthRule(
    'quarterSuppression',
    'Taken out at the waist, each quarter',
    'skirtQuarter - waistQuarter',
    geometry,
  ),
  lengthRule('sideTakes', 'Of it at the side seam', 'min(quarterSuppression * 0.42, 3cm)'),
  lengthRule('waistShift', 'Front waist wider than the back', 'min(1cm, quarterSuppression - sideTakes)'),
  lengthRule('frontTakes', 'Front darts in all', 'quarterSuppression - sideTakes - waistShift', geometry),
  lengthRule('backTakes', 'Back darts in all', 'quarterSuppression - sideTakes + waistShift', geometry),
  lengthRule('sideRise', 'Waist higher at the side', 'min(1.2cm, quarterSuppression * 0.3)'),
  lengthRule('centreBackDrop', 'Waist lower at the centre back', 'min(0.8cm, quarterSuppression * 0.15)'),
  lengthRule('frontDartOut', 'First front dart from the centre', 'skirtQuarter * (0.52 - frontDarts * 0.1)'),
  lengthRule('frontDartBetween', 'From one front dart to the next', 'skirtQuarter * 0.3'),
  lengthRule('frontDartLong', 'Front dart length', 'min(9.5cm, waistToHip * 0.48)'),
  lengthRule('backDartOut', 'First back dart from the centre', 'skirtQuarter * (0.56 - backDarts * 0.1)'),
  lengthRule('backDartBetween', 'From one back dart to the next', 'skirtQuarter * 0.3'),
  lengthRule('backDartLong', 'First back dart length', 'min(13cm, waistToHip * 0.65)'),
  lengthRule('backDartShorter', 'Second back dart length', 'backDartLong - 1cm'),
]

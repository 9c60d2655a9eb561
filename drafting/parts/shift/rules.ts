import type { DesignValue, RuleDefinition } from '../../contract'
import { length, yesNo } from '../../pen/design'
import { lengthRule } from '../../pen/garment'

const darted = { id: 'waistDarts', is: [true] }

/** A dress that hangs from the shoulders, shaped through the waist. */
export const shiftDesign: readonly DesignValue[] = [
  length('length', 'Length below the waist', 'skirt', { default: 600, min: 350, max: 1050 }),
  length('waistIn', 'Side taken in at the waist', 'body', { default: 20, min: 0, max: 35 }),
  yesNo('waistDarts', 'Darts at the waist', 'darts', true),
  length('waistTip', 'Front dart below the bust point', 'darts', { default: 30, min: 15, max: 60 }, darted),
  length('bustEase', 'Bust ease', 'body', { default: 80, min: 50, max: 160 }),
  length('waistEase', 'Waist ease at least', 'body', { default: 80, min: 40, max: 160 }),
  length('hipEase', 'Hip ease', 'body', { default: 60, min: 40, max: 140 }),
  length('hemFlare', 'Hem wider by, each quarter', 'skirt', { default: 15, min: 0, max: 60 }),
  length('hemAllowance', 'Hem allowance', 'allowances', { default: 40, min: 0, max: 60 }),
]

/** Quarters of the waist, hip and hem, and the darts of the waist. Common practice, no published source. */
export const shiftRules: readonly RuleDefinition[] = [
  lengthRule(
    'backWaistQuarter',
    'Back quarter at the waist',
    'max(backQuarter - waistIn, (waist + waistEase) / 4 - 0.5cm)',
  ),
  lengthRule(
    'backHipQuarter',
    'Back quarter at the hip',
    'max((hip + hipEase) / 4 - 0.5cm, backWaistQuarter)',
  ),
  lengthRule('backHemQuarter', 'Back quarter at the hem', 'backHipQuarter + hemFlare'),
  lengthRule(
    'waistSpare',
    'To take out at the waist, each half',
    'max(backWaistQuarter * 2 + frontQuarter - backQuarter - (waist + waistEase) / 2, 0cm)',
  ),
  lengthRule('frontDart', 'Front waist dart', 'min(waistSpare * 0.45, 2.5cm)'),
  lengthRule('backDart', 'Back waist dart', 'min(waistSpare * 0.55, 3cm)'),
  lengthRule('frontDartBelow', 'Front dart below the waist', 'min(9.5cm, waistToHip * 0.48)'),
  lengthRule('backDartBelow', 'Back dart below the waist', 'min(13cm, waistToHip * 0.65)'),
]

import type { RuleDefinition } from '../../contract'
import type { Garment } from '../../pen/garment'
import { angleRule, lengthRule } from '../../pen/garment'
import { neckRules } from '../neck-rules'
import { sleeveEstimates, sleeveFound } from '../sleeves'

/** Measurements that a fitted bodice can estimate when they were not taken. */
export const bodiceEstimates: readonly string[] = [
  'height',
  'hip',
  'neckBase',
  'shoulderLength',
  'acrossBack',
  'acrossFront',
  'napeToWaist',
  'frontWaistLength',
  'bustHeight',
  'bustSpan',
  ...sleeveEstimates,
]

/** Neck, shoulders, quarters and bust of a fitted body. Common practice where no source is named. */
export const upperBodiceRules: readonly RuleDefinition[] = [
  lengthRule('backNeckWidth', 'Half width of the back neck', 'neckBase / 5 - 0.2cm'),
  lengthRule('frontNeckWidth', 'Half width of the front neck', 'neckBase / 5 - 0.5cm'),
  lengthRule('napeDepth', 'Nape below the side neck', 'backNeckWidth * 0.3'),
  lengthRule('backNeckDepth', 'Back neck depth', 'napeDepth + neckFall + backNeckDrop'),
  lengthRule('frontNeckDepth', 'Front neck depth', 'neckBase / 5 + 0.2cm + frontNeckDrop'),
  lengthRule('vNeckDepth', 'V neck: front depth', 'frontNeckDepth + 5.8cm'),
  lengthRule('boatWidening', 'Boat neck: opening along the shoulder', 'frontShoulder * 0.35 + neckWidening'),
  lengthRule('boatNeckDepth', 'Boat neck: front depth', '4cm + frontNeckFall + frontNeckDrop'),
  ...neckRules,
  lengthRule('frontShoulder', 'Front shoulder', 'shoulderLength'),
  lengthRule('shoulderEase', 'Ease of the back shoulder', '0.8cm'),
  lengthRule('backShoulder', 'Back shoulder', 'shoulderLength + shoulderEase'),
  lengthRule('scyeLine', 'Underarm below the nape', 'bust / 8 + 9.5cm'),
  lengthRule('balance', 'Front longer than back over the bust', 'frontWaistLength - napeToWaist - napeDepth'),
  lengthRule('frontScye', 'Underarm below the front side neck', 'scyeLine + napeDepth + balance'),
  lengthRule('backQuarter', 'Back quarter', '(bust + bustEase) / 4 - 0.5cm'),
  lengthRule('frontQuarter', 'Front quarter', '(bust + bustEase) / 4 + 0.5cm'),
  lengthRule(
    'backHalf',
    'Half across the back',
    'min(acrossBack / 2 + 0.7cm, backQuarter - 3.3cm, backTip - 0.6cm)',
  ),
  lengthRule(
    'frontHalf',
    'Half across the front',
    'min(acrossFront / 2 + 0.4cm, frontQuarter - 4.5cm, frontTip - 1.2cm)',
  ),
  lengthRule('bustPointOut', 'Bust point from the centre', 'bustSpan / 2 + 0.3cm'),
  angleRule(
    'bustDartAngle',
    'Angle of the bust dart',
    'min(max(bust / 4cm * 1° - 6.5°, 8°), 30°)',
    'from memory',
  ),
]

/** What is taken out at the waist, and where. Common practice. */
export const bodiceWaistRules: readonly RuleDefinition[] = [
  lengthRule(
    'suppression',
    'Taken out at the waist, each half',
    'max((bust + bustEase) / 2 - (waist + waistEase) / 2, 0cm)',
  ),
  lengthRule('frontDart', 'Front waist dart', 'suppression * 0.32'),
  lengthRule('backDart', 'Back waist dart', 'suppression * 0.26'),
  lengthRule('centreBackIn', 'Centre back', 'suppression * 0.06'),
  lengthRule('frontWaistHalf', 'Half the front waist', '(waist + waistEase) / 4 + 0.5cm'),
  lengthRule('backWaistHalf', 'Half the back waist', '(waist + waistEase) / 4 - 0.5cm'),
]

/** What the draft of a fitted body finds. */
export const bodiceFound: Garment['found'] = {
  armholeDeepening: 'length',
  backTip: 'length',
  frontTip: 'length',
  neckFall: 'length',
  frontNeckFall: 'length',
  ...sleeveFound,
}

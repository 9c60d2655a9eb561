import type { DesignValue } from '../../contract'
import { angle, choice, length, share } from '../../pen/design'
import { neckDesign } from '../necklines'

const withDarts = { id: 'shaping', is: ['darts'] }

/** Bust and waist darts of a fitted bodice, or the seams that take their place. */
export const dartDesign: readonly DesignValue[] = [
  choice('shaping', 'Shaped by', 'darts', [
    'darts',
    'princess from the shoulder',
    'princess from the armhole',
  ]),
  choice(
    'dartTo',
    'Bust dart to',
    'darts',
    ['side', 'shoulder', 'armhole', 'neck', 'waist', 'centre front'],
    withDarts,
  ),
  choice(
    'dartSharedWith',
    'Bust dart shared with',
    'darts',
    ['nothing', 'waist', 'side', 'shoulder', 'armhole', 'neck', 'centre front'],
    withDarts,
  ),
  share(
    'dartShare',
    'Share of the second dart',
    'darts',
    { default: 0.5, min: 0.2, max: 0.8 },
    { id: 'dartSharedWith', is: ['waist', 'side', 'shoulder', 'armhole', 'neck', 'centre front'] },
  ),
  length(
    'dartBelowArmhole',
    'Dart below the armhole',
    'darts',
    { default: 60, min: 30, max: 90 },
    { id: 'dartTo', is: ['side'] },
  ),
  length('dartShort', 'Dart short of the bust point', 'darts', { default: 25, min: 15, max: 40 }),
  length('waistTip', 'Waist dart below the bust point', 'darts', { default: 22, min: 15, max: 50 }),
]

/** Neck and shoulders of a fitted bodice. */
export const upperBodiceDesign: readonly DesignValue[] = [
  ...neckDesign('round', 'V', 'square', 'scoop', 'sweetheart', 'keyhole', 'high', 'boat'),
  length('neckWidening', 'Neck wider by', 'neckline', { default: 0, min: 0, max: 60 }),
  length('frontNeckDrop', 'Front neck lower by', 'neckline', { default: 0, min: 0, max: 100 }),
  length('backNeckDrop', 'Back neck lower by', 'neckline', { default: 0, min: 0, max: 100 }),
  length('facingDepth', 'Facing depth', 'neckline', { default: 50.8, min: 30, max: 60 }),
  angle('backSlope', 'Back shoulder slope', 'shoulder', { default: 18, min: 10, max: 26 }),
  angle('frontSlope', 'Front shoulder slope', 'shoulder', { default: 22, min: 12, max: 30 }),
]

export const bodiceEaseDesign: readonly DesignValue[] = [
  length('bustEase', 'Bust ease', 'body', { default: 80, min: 40, max: 160 }),
  length('waistEase', 'Waist ease', 'body', { default: 40, min: 10, max: 120 }),
]

export const bodiceAllowances: readonly DesignValue[] = [
  length('neckAllowance', 'Neck allowance', 'allowances', { default: 6.35, min: 0, max: 15 }),
  length('shoulderAllowance', 'Shoulder allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
  length('armholeAllowance', 'Armhole allowance', 'allowances', { default: 10, min: 0, max: 15 }),
  length('sideAllowance', 'Side allowance', 'allowances', { default: 19, min: 0, max: 30 }),
  length('centreBackAllowance', 'Centre back allowance', 'allowances', { default: 19, min: 0, max: 30 }),
  length('panelAllowance', 'Panel seam allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
  length('waistAllowance', 'Waist allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
]

import { choice, length, yesNo } from '../pen/design'
import { garment, geometry, lengthRule } from '../pen/garment'
import type { Pen } from '../pen/pen'
import { drawKimonoBody, kimonoDesign, kimonoFound, kimonoRules } from '../parts/kimono'
import { neckRules } from '../parts/neck-rules'
import { openingDesign } from '../parts/openings'
import { headRules } from '../parts/openings/head-room'

/**
 * A kaftan: wide, straight from the underarm to the hem, its sleeves cut in one with the body. Rules: common practice, no
 * published source.
 */
export const kaftan = garment({
  id: 'kaftan',
  name: 'Kaftan',
  needs: ['bust', 'hip'],
  estimates: [
    'height',
    'neckBase',
    'acrossShoulders',
    'napeToWaist',
    'frontWaistLength',
    'waistToHip',
    'upperArm',
    'armLength',
    'head',
  ],
  design: [
    choice('neckShape', 'Neck shape', 'neckline', ['round', 'V', 'square', 'scoop']),
    length('neckWidening', 'Neck wider by', 'neckline', { default: 0, min: 0, max: 50 }),
    length('frontNeckDrop', 'Front neck lower by', 'neckline', { default: 0, min: 0, max: 80 }),
    length('backNeckDrop', 'Back neck lower by', 'neckline', { default: 0, min: 0, max: 60 }),
    length('facingDepth', 'Facing depth', 'neckline', { default: 50.8, min: 30, max: 80 }),
    ...kimonoDesign({ slope: 12, reach: 0.75, mouth: 200, lower: 55 }),
    length('bustEase', 'Ease of the body', 'body', { default: 400, min: 200, max: 600 }),
    length('length', 'Length from the shoulder', 'skirt', { default: 1300, min: 800, max: 1600 }),
    length('sideFlare', 'Side out at the hem by', 'skirt', { default: 60, min: 20, max: 150 }),
    yesNo('sideSlits', 'Side slits', 'skirt', true),
    length(
      'slitHeight',
      'Slit, from the hem',
      'skirt',
      { default: 300, min: 100, max: 600 },
      { id: 'sideSlits', is: [true] },
    ),
    ...openingDesign(['front slit', 'none', 'keyhole']),
    length('neckAllowance', 'Neck allowance', 'allowances', { default: 8, min: 0, max: 10 }),
    length('shoulderAllowance', 'Shoulder allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 25 }),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 25.4, min: 0, max: 40 }),
  ],
  rules: [
    lengthRule('neckWidth', 'Half width of the close neck', 'neckBase / 5 - 0.35cm'),
    lengthRule('frontNeckDepth', 'Front neck depth', 'neckBase / 5 + 0.2cm + frontNeckDrop'),
    lengthRule('backNeckDepth', 'Back neck depth', '2.2cm + neckFall + backNeckDrop'),
    lengthRule('vNeckDepth', 'V neck: front depth', 'neckBase / 5 + 6cm + frontNeckDrop'),
    ...neckRules,
    lengthRule('halfShoulder', 'Half the shoulders', 'acrossShoulders / 2'),
    lengthRule('armholeDepth', 'Armhole depth', 'bust / 6 + 1.5in'),
    lengthRule('kimonoQuarter', 'Quarter of the body', '(max(bust, hip) + bustEase) / 4'),
    ...kimonoRules,
    lengthRule('lengthDrawn', 'Length, below the underarm', 'max(length, underarmDepth + 30cm)'),
    lengthRule(
      'slitDrawn',
      'Slit, below the underarm',
      'min(slitHeight, lengthDrawn - underarmDepth - 18cm)',
    ),
    lengthRule('hipLevel', 'Hip, from the side neck', 'napeToWaist + 2.2cm + waistToHip'),
    lengthRule(
      'balance',
      'Front longer than back over the bust',
      'max(frontWaistLength - napeToWaist - 2.2cm, 0cm)',
    ),
    lengthRule(
      'frontDip',
      'Front hem lower by',
      'min(balance, 1.5cm, sideFlare * kimonoQuarter / lengthDrawn * 0.6)',
      geometry,
    ),
    ...headRules,
  ],
  found: { ...kimonoFound, neckFall: 'length', zipDrawn: 'length' },
  draft(pen) {
    const { front } = drawKimonoBody(pen, { slits: pen.chosen('sideSlits') === true, banded: false })
    sayWhatIsOdd(pen, front.at('wristTop').x)
  },
})

function sayWhatIsOdd(pen: Pen, wide: number): void {
  const longer = pen.value('lengthDrawn') - pen.value('length')
  if (longer > 0.01) {
    pen.caution(
      'lengthened',
      `The hem would be at the underarm; the garment is drawn ${pen.say(longer)} longer.`,
      'length',
    )
  }
  if (pen.chosen('sideSlits')) {
    const shorter = pen.value('slitHeight') - pen.value('slitDrawn')
    if (shorter > 0.01) {
      pen.caution(
        'slit-shortened',
        `The slit is made ${pen.say(shorter)} shorter to stay clear of the underarm.`,
        'slitHeight',
      )
    }
  } else if (pen.value('length') > 1000 && pen.value('bustEase') < 300) {
    pen.caution('narrow-to-walk', 'Long, narrow and without slits it hinders the step.', 'sideSlits')
  }
  if (wide > 720) {
    pen.caution(
      'wide-piece',
      `From the centre to the end of the sleeve it measures ${pen.say(wide)}: on cloth of 140 cm or less the sleeve needs a join.`,
      'sleeveReach',
    )
  }
}

import { choice, length } from '../pen/design'
import { angleRule, garment, geometry, lengthRule } from '../pen/garment'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { deepenArmhole } from '../parts/armhole-room'
import { facedBody } from '../parts/facing'
import { faceNeckAndArmholes } from '../parts/facings'
import { drawHalf, upperMarks } from '../parts/flared-half'
import { hemBand } from '../parts/hem-band'
import { drawKimonoBody, kimonoDesign, kimonoFound, kimonoRules } from '../parts/kimono'
import { straightHem, straightLower, type StraightWay } from '../parts/kimono/half'
import { fitLevels } from '../parts/levels'
import { neckLeans } from '../parts/neck-lean'
import { neckRules } from '../parts/neck-rules'
import { drawOpening, openingDesign } from '../parts/openings'
import { headRules } from '../parts/openings/head-room'
import {
  sleeveDesign,
  sleeveEstimates,
  sleeveFound,
  sleeveInto,
  sleeveRules,
  wholeArmhole,
} from '../parts/sleeves'

const setIn = ['short', 'plain', 'three-quarter', 'bell', 'cap'] as const
const withArmhole = { id: 'sleeve', is: [...setIn, 'none'] }

/** A boxy blouse of firm cloth, without darts. Rules: common practice, no published source, where none is named. */
export const boxyBlouse = garment({
  id: 'boxy-blouse',
  name: 'Boxy blouse',
  needs: ['bust', 'waist', 'hip'],
  estimates: [
    'height',
    'neckBase',
    'acrossShoulders',
    'acrossBack',
    'acrossFront',
    'napeToWaist',
    'frontWaistLength',
    'waistToHip',
    ...sleeveEstimates.filter((id) => id !== 'wrist'),
    'head',
  ],
  design: [
    choice('neckShape', 'Neck shape', 'neckline', ['round', 'V', 'square', 'scoop']),
    length('neckWidening', 'Neck wider by', 'neckline', { default: 15, min: 0, max: 45 }),
    length('frontNeckDrop', 'Front neck lower by', 'neckline', { default: 10, min: 0, max: 80 }),
    length('backNeckDrop', 'Back neck lower by', 'neckline', { default: 0, min: 0, max: 50 }),
    length('facingDepth', 'Facing depth', 'neckline', { default: 50.8, min: 30, max: 80 }),
    length('shoulderSlope', 'Shoulder slope', 'shoulder', { default: 38.1, min: 25, max: 60 }, withArmhole),
    length('shoulderDrop', 'Shoulder dropped by', 'shoulder', { default: 20, min: 0, max: 50 }, withArmhole),
    length('armholeDrop', 'Armhole lower by', 'armhole', { default: 15, min: 0, max: 60 }, withArmhole),
    length('frontHollow', 'Front armhole hollow', 'armhole', { default: 20, min: 12, max: 30 }, withArmhole),
    length('backHollow', 'Back armhole hollow', 'armhole', { default: 12, min: 8, max: 22 }, withArmhole),
    length('bustEase', 'Ease of the body', 'body', { default: 140, min: 100, max: 240 }),
    ...sleeveDesign(...setIn, 'kimono', 'none'),
    ...kimonoDesign({ slope: 18, reach: 0.4, mouth: 190, lower: 50 }, { id: 'sleeve', is: ['kimono'] }),
    length('length', 'Length from the shoulder', 'skirt', { default: 650, min: 450, max: 800 }),
    length('sideFlare', 'Side out at the hem by', 'skirt', { default: 10, min: 5, max: 40 }),
    choice('hemFinish', 'Hem', 'hem', ['plain', 'band']),
    length(
      'bandDepth',
      'Hem band, finished depth',
      'hem',
      { default: 40, min: 25, max: 80 },
      { id: 'hemFinish', is: ['band'] },
    ),
    ...openingDesign(['none', 'front slit', 'keyhole']),
    length('neckAllowance', 'Neck allowance', 'allowances', { default: 8, min: 0, max: 10 }),
    length('shoulderAllowance', 'Shoulder allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
    length('armholeAllowance', 'Armhole allowance', 'allowances', { default: 10, min: 0, max: 15 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 25 }),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 25.4, min: 0, max: 40 }),
  ],
  rules: [
    lengthRule('neckWidth', 'Half width of the close neck', 'neckBase / 5 - 0.35cm'),
    lengthRule('frontNeckDepth', 'Front neck depth', 'neckBase / 5 + 0.2cm + frontNeckDrop'),
    lengthRule('backNeckDepth', 'Back neck depth', '2.2cm + neckFall + backNeckDrop'),
    lengthRule('vNeckDepth', 'V neck: front depth', 'neckBase / 5 + 6cm + frontNeckDrop'),
    ...neckRules,
    lengthRule('halfShoulder', 'Half the shoulders, dropped', 'acrossShoulders / 2 + shoulderDrop'),
    lengthRule('armholeDepth', 'Armhole depth', 'bust / 6 + 1.5in'),
    lengthRule('sleevedLowering', 'Lower for a sleeve', '0.5in + armholeDrop'),
    lengthRule('quarterBust', 'Quarter of the body', '(max(bust, waist, hip) + bustEase) / 4'),
    lengthRule('kimonoQuarter', 'Quarter of the body', 'quarterBust', geometry),
    lengthRule('frontHollowIn', 'Front hollow', 'max(frontHollow, halfShoulder - quarterBust + 3.2cm)'),
    lengthRule('backHollowIn', 'Back hollow', 'max(backHollow, halfShoulder - quarterBust + 3.2cm)'),
    angleRule('flareAngle', 'Angle of the side seam', '0°', geometry),
    lengthRule('lengthDrawn', 'Length, below the underarm', 'max(length, underarmDepth + 20cm)'),
    lengthRule('bandFold', 'Hem band, cut depth', 'bandDepth * 2'),
    lengthRule('waistLevel', 'Waist, from the side neck', 'napeToWaist + 2.2cm'),
    lengthRule('hipLevel', 'Hip, from the side neck', 'napeToWaist + 2.2cm + waistToHip'),
    lengthRule(
      'balance',
      'Front longer than back over the bust',
      'max(frontWaistLength - napeToWaist - 2.2cm, 0cm)',
    ),
    lengthRule(
      'frontDip',
      'Front hem lower by',
      'min(balance, 1.5cm, sideFlare * quarterBust / lengthDrawn * 0.6)',
      geometry,
    ),
    lengthRule('leastBareArmhole', 'Least armhole without a sleeve', 'upperArm + 4cm'),
    ...kimonoRules,
    ...headRules,
    ...sleeveRules(...setIn),
  ],
  found: {
    ...kimonoFound,
    ...sleeveFound,
    armholeDeepening: 'length',
    neckFall: 'length',
    frontBand: 'length',
    backBand: 'length',
  },
  draft(pen) {
    const way = { slits: false, banded: pen.chosen('hemFinish') === 'band' }
    const inOne = pen.chosen('sleeve') === 'kimono'
    const { front, back } = inOne ? drawKimonoBody(pen, way) : drawWithArmholes(pen, way)
    if (way.banded) hemBand(pen, front, back)
    sayWhatIsOdd(pen)
  },
})

/** A straight body with armholes, its shoulders dropped, and the sleeve of the style. */
function drawWithArmholes(pen: Pen, way: StraightWay): { front: PiecePen; back: PiecePen } {
  deepenArmhole(pen, { x: 0, y: 1 })
  const front = pen.piece('front', 'Front')
  const back = pen.piece('back', 'Back')
  for (const [piece, side] of [
    [front, 'front'],
    [back, 'back'],
  ] as const) {
    upperMarks(pen, piece, side)
    straightLower(pen, piece, way)
  }
  front.go('centreHem', 'lengthMark', 'down', 'frontDip', {
    say: 'Lower the centre front by what the bust takes up',
  })
  const leans = neckLeans(pen, front, back)
  const necks = front.usesOf('centreNeck', 'sideNeck') | back.usesOf('centreNeck')
  drawHalf(pen, front, 'front', leans.front, necks)
  drawHalf(pen, back, 'back', leans.back, necks)
  straightHem(pen, front, 'centreHem', way)
  straightHem(pen, back, 'lengthMark', way)
  const below = { edge: 'hem', role: 'hem', allowance: 'hemAllowance' } as const
  const centres = drawOpening(
    pen,
    { piece: front, foot: 'centreHem', below },
    { piece: back, foot: 'lengthMark', below },
  )
  for (const piece of [front, back]) {
    piece.cut({ cloth: 'main', count: 1, onFold: true, handed: false })
    const long = piece.at('lengthMark').y
    piece.grain({ x: 60, y: long * 0.5 }, { x: 60, y: long * 0.85 })
  }
  for (const edge of ['shoulder', 'side']) {
    pen.sew({
      id: edge,
      name: edge === 'side' ? 'Side seam' : 'Shoulder',
      a: [{ piece: 'front', edge }],
      b: [{ piece: 'back', edge }],
      smooth: true,
    })
  }
  fitLevels(pen, front, back)
  const { bare } = sleeveInto(pen, wholeArmhole(front), wholeArmhole(back))
  faceNeckAndArmholes(pen, [facedBody(front), centres.front], [facedBody(back), centres.back], bare)
  return { front, back }
}

function sayWhatIsOdd(pen: Pen): void {
  const longer = pen.value('lengthDrawn') - pen.value('length')
  if (longer > 0.01) {
    pen.caution(
      'lengthened',
      `The hem would be at the underarm; the blouse is drawn ${pen.say(longer)} longer.`,
      'length',
    )
  }
  const lost = pen.value('balance') - pen.value('frontDip')
  if (lost > 15) {
    pen.caution(
      'balance',
      `Over the bust the front is ${pen.say(lost)} longer than a body without darts takes up. Firm cloth hides some; a bust dart takes it all.`,
      'frontWaistLength',
      'napeToWaist',
    )
  }
}

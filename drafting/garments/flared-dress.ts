import { pathLength } from '../geometry'
import { angleRule, garment, geometry, lengthRule } from '../pen/garment'
import { choice, length, share } from '../pen/design'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { collarDesign, collarRules } from '../parts/collars'
import { faceNeckAndArmholes } from '../parts/facings'
import { facedBody } from '../parts/facing'
import { deepenArmhole } from '../parts/armhole-room'
import { drawHalf, flareDirection, hemOf, lowerMarks, upperMarks } from '../parts/flared-half'
import { neckRules } from '../parts/neck-rules'
import { neckDesign } from '../parts/necklines'
import { neckLeans } from '../parts/neck-lean'
import { fitLevels } from '../parts/levels'
import { pocketBag, pocketDesign, pocketMouth, sewWithPocket } from '../parts/pockets/in-seam'
import {
  allSleeves,
  sleeveDesign,
  sleeveEstimates,
  sleeveFound,
  sleeveInto,
  sleeveRules,
  wholeArmhole,
} from '../parts/sleeves'
import { drawOpening, openingDesign, openingRules } from '../parts/openings'

/**
 * The one-piece flared dress of freehand cutting, in quarters: front on the fold, back on the fold or with a centre seam for
 * the zip. Rules: common practice, no published source, where none is named.
 */
export const flaredDress = garment({
  id: 'flared-dress',
  name: 'Flared dress',
  needs: ['bust', 'waist', 'hip'],
  estimates: [
    'height',
    'neckBase',
    'shoulderLength',
    'acrossShoulders',
    'acrossBack',
    'acrossFront',
    'napeToWaist',
    'frontWaistLength',
    'bustHeight',
    'waistToHip',
    ...sleeveEstimates,
    'head',
  ],
  design: [
    ...neckDesign('round', 'V', 'square', 'boat', 'scoop', 'sweetheart', 'keyhole', 'high'),
    length('neckWidening', 'Neck wider by', 'neckline', { default: 0, min: 0, max: 70 }),
    length('frontNeckDrop', 'Front neck lower by', 'neckline', { default: 0, min: 0, max: 130 }),
    length('backNeckDrop', 'Back neck lower by', 'neckline', { default: 0, min: 0, max: 120 }),
    length('facingDepth', 'Facing depth', 'neckline', { default: 50.8, min: 30, max: 90 }),
    length('shoulderSlope', 'Shoulder slope', 'shoulder', { default: 38.1, min: 15, max: 55 }),
    length('armholeDrop', 'Armhole lower by', 'armhole', { default: 0, min: 0, max: 80 }),
    length('frontHollow', 'Front armhole hollow', 'armhole', { default: 22.225, min: 12, max: 35 }),
    length('backHollow', 'Back armhole hollow', 'armhole', { default: 12.7, min: 8, max: 25 }),
    length('bustEase', 'Bust ease', 'body', { default: 80, min: 40, max: 200 }),
    share('flare', 'Flare, share of a circle', 'skirt', { default: 0.25, min: 0.125, max: 0.5 }),
    length('length', 'Length from the shoulder', 'skirt', { default: 1050, min: 600, max: 1600 }),
    choice('hemWay', 'Way of drawing the hem', 'skirt', ['equal drop', 'swung']),
    length(
      'sideLift',
      'Side lift at a quarter circle',
      'skirt',
      { default: 10, min: 0, max: 20 },
      {
        id: 'hemWay',
        is: ['equal drop'],
      },
    ),
    ...sleeveDesign('plain', 'none', ...allSleeves.slice(1)),
    ...collarDesign,
    ...openingDesign(['zip', 'none', 'button band', 'keyhole', 'side zip']),
    ...pocketDesign,
    length('neckAllowance', 'Neck allowance', 'allowances', { default: 10, min: 0, max: 12.7 }),
    length('shoulderAllowance', 'Shoulder allowance', 'allowances', { default: 12.7, min: 0, max: 30 }),
    length('armholeAllowance', 'Armhole allowance', 'allowances', { default: 12.7, min: 0, max: 15 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 25.4, min: 0, max: 40 }),
    length('centreBackAllowance', 'Centre back allowance', 'allowances', { default: 25.4, min: 0, max: 40 }),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 25.4, min: 0, max: 40 }),
  ],
  rules: [
    lengthRule('neckWidth', 'Half width of the close neck', 'neckBase / 5 - 0.35cm'),
    lengthRule('frontNeckDepth', 'Front neck depth', 'neckBase / 5 + 0.2cm + frontNeckDrop'),
    lengthRule('backNeckDepth', 'Back neck depth', '2.2cm + neckFall * 1.6 + backNeckDrop'),
    lengthRule(
      'boatWidening',
      'Boat neck: opening along the shoulder',
      '(halfShoulder - neckWidth) * 0.35 + neckWidening',
    ),
    lengthRule('boatNeckDepth', 'Boat neck: front depth', '4cm + neckFall + frontNeckDrop'),
    lengthRule('vNeckDepth', 'V neck: front depth', 'neckBase / 5 + 6cm + frontNeckDrop'),
    ...neckRules,
    lengthRule('halfShoulder', 'Half the shoulders', 'acrossShoulders / 2'),
    lengthRule('armholeDepth', 'Armhole depth', 'bust / 6 + 1.5in'),
    lengthRule('sleevedLowering', 'Lower for a sleeve', '0.5in + armholeDrop'),
    lengthRule('quarterBust', 'Quarter bust', '(bust + bustEase) / 4'),
    lengthRule(
      'frontHollowIn',
      'Front hollow, inside the underarm',
      'max(frontHollow, halfShoulder - quarterBust + 4.2cm)',
    ),
    lengthRule(
      'backHollowIn',
      'Back hollow, inside the underarm',
      'max(backHollow, halfShoulder - quarterBust + 4.2cm)',
    ),
    angleRule('flareAngle', 'Angle of the side seam', 'flare * 90°', geometry),
    lengthRule('sideLength', 'Length of the side seam', 'hemDrop - sideLift * flare * 4'),
    lengthRule('swungSide', 'Length of the side seam, swung', 'hemDrop - swingLoss', geometry),
    lengthRule('waistLevel', 'Waist, from the side neck', 'napeToWaist + 2.2cm'),
    lengthRule('hipLevel', 'Hip, from the side neck', 'napeToWaist + 2.2cm + waistToHip'),
    lengthRule(
      'balance',
      'Front longer than back over the bust',
      'max(frontWaistLength - napeToWaist - 2.2cm, 0cm)',
    ),
    lengthRule('frontDip', 'Front hem lower by', 'min(balance, 1.5cm)'),
    lengthRule('leastBareArmhole', 'Least armhole without a sleeve', 'upperArm + 4cm'),
    ...collarRules,
    ...openingRules,
    ...sleeveRules(...allSleeves),
  ],
  found: {
    armholeDeepening: 'length',
    neckFall: 'length',
    zipDrawn: 'length',
    hemDrop: 'length',
    swingLoss: 'length',
    ...sleeveFound,
  },
  draft(pen) {
    const direction = flareDirection(pen.value('flareAngle'))
    deepenArmhole(pen, direction)
    const front = pen.piece('front', 'Front')
    const back = pen.piece('back', 'Back')
    for (const [piece, side] of [
      [front, 'front'],
      [back, 'back'],
    ] as const) {
      upperMarks(pen, piece, side)
      lowerMarks(pen, piece, direction)
    }
    checkLength(pen, front)
    const leans = neckLeans(pen, front, back)
    const necks = front.usesOf('centreNeck', 'sideNeck') | back.usesOf('centreNeck')
    drawHalf(pen, front, 'front', leans.front, necks)
    drawHalf(pen, back, 'back', leans.back, necks)
    drawFrontHem(pen, front)
    hemOf(pen, back, 'lengthMark')
    const below = { edge: 'hem', role: 'hem', allowance: 'hemAllowance' } as const
    const centres = drawOpening(
      pen,
      { piece: front, foot: hemCentre(pen), below },
      { piece: back, foot: 'lengthMark', below },
    )
    for (const [piece, { kind }] of [
      [front, centres.front],
      [back, centres.back],
    ] as const) {
      const onFold = kind === 'fold'
      piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
    }
    for (const piece of [front, back]) {
      const long = piece.at('lengthMark').y
      piece.grain({ x: 60, y: long * 0.45 }, { x: 60, y: long * 0.8 })
    }
    pen.sew({
      id: 'shoulder',
      name: 'Shoulder',
      a: [{ piece: 'front', edge: 'shoulder' }],
      b: [{ piece: 'back', edge: 'shoulder' }],
      smooth: true,
    })
    sewSides(pen, front)
    fitLevels(pen, front, back)
    const { bare } = sleeveInto(pen, wholeArmhole(front), wholeArmhole(back))
    faceNeckAndArmholes(pen, [facedBody(front), centres.front], [facedBody(back), centres.back], bare)
    sayWhatIsOdd(pen)
  },
})

const swung = (pen: Pen): boolean => pen.chosen('hemWay') === 'swung'
const hemCentre = (pen: Pen): string => (swung(pen) ? 'lengthMark' : 'centreHem')

function checkLength(pen: Pen, front: PiecePen): void {
  const room = front.at('lengthMark').y - front.at('underarm').y
  if (room >= 200) return
  const least = front.at('underarm').y + 200
  pen.refuse({
    field: 'length',
    code: 'impossible-shape',
    message: `The hem would be at the bust. Make the dress at least ${pen.say(least)} long.`,
    min: least,
  })
}

/** The front is longer over the bust; a swung hem has no place for that. */
function drawFrontHem(pen: Pen, front: PiecePen): void {
  if (!swung(pen)) {
    front.go('centreHem', 'lengthMark', 'down', 'frontDip', {
      say: 'Lower the centre front by what the bust takes up',
    })
  }
  hemOf(pen, front, hemCentre(pen))
}

function sewSides(pen: Pen, front: PiecePen): void {
  const a = { piece: 'front', edge: 'side' }
  const b = { piece: 'back', edge: 'side' }
  const seam = { id: 'side', name: 'Side seam', smooth: true }
  const mouth = pen.chosen('pockets')
    ? pocketMouth(pen, front.edge('side').path, pen.value('waistLevel'))
    : undefined
  pen.settle()
  if (!mouth) return pen.sew({ ...seam, a: [a], b: [b] })
  const whole = pathLength(front.edge('side').path)
  pocketBag(pen, whole - mouth.from - 40, front.edge('side').uses | pen.usesOf(['waistLevel', 'pocketTop']))
  sewWithPocket(pen, seam, a, b, mouth, whole)
}

function sayWhatIsOdd(pen: Pen): void {
  if (pen.value('flare') > 0.25) {
    pen.caution(
      'much-flare',
      'More than a quarter circle from the underarm hangs in deep folds and takes much cloth. Flare from a waist seam instead, or make a toile first.',
      'flare',
    )
  }
  const balance = pen.value('balance')
  if (balance > 15) {
    pen.caution(
      'balance',
      `Over the bust the front is ${pen.say(balance)} longer than the back; only ${pen.say(15)} goes into the hem. The front may ride up: a bust dart would take the rest.`,
      'frontWaistLength',
      'napeToWaist',
    )
  }
  if (swung(pen)) {
    pen.caution(
      'side-shorter',
      `A hem swung from the point of the flare leaves the side ${pen.say(pen.value('swingLoss'))} shorter than the centre.`,
      'hemWay',
    )
  }
}

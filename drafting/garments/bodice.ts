import { angleRule, garment, lengthRule } from '../pen/garment'
import { angle, choice, length } from '../pen/design'
import { fitAcross, type Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import { deepenFitted } from '../parts/armhole-room'
import { bodiceBackMarks, drawBodiceBack } from '../parts/bodice-back'
import { bodiceFrontMarks, drawBodiceFront, type BodiceFront } from '../parts/bodice-front'
import { faceNeckAndArmholes } from '../parts/facings'
import type { FittedWaist } from '../parts/fitted-waist'
import { neckRules } from '../parts/neck-rules'
import { neckLeans } from '../parts/neck-lean'
import { setInSleeve, wholeArmhole } from '../parts/set-in-sleeve'
import { sleeveDesign, sleeveRules } from '../parts/sleeves'

/** The fitted bodice with bust and waist darts; the bust dart opens where the style puts it. Rules: common practice. */
export const bodice = garment({
  id: 'bodice',
  name: 'Fitted bodice',
  needs: ['bust', 'waist'],
  estimates: [
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
    'upperArm',
    'armLength',
  ],
  design: [
    choice('dartTo', 'Bust dart to', 'darts', ['side', 'shoulder', 'armhole', 'neck', 'waist']),
    length(
      'dartBelowArmhole',
      'Dart below the armhole',
      'darts',
      { default: 60, min: 30, max: 90 },
      { id: 'dartTo', is: ['side'] },
    ),
    length('dartShort', 'Dart short of the bust point', 'darts', { default: 25, min: 15, max: 40 }),
    length('waistTip', 'Waist dart below the bust point', 'darts', { default: 22, min: 15, max: 50 }),
    choice('neckShape', 'Neck shape', 'neckline', ['round', 'V', 'square', 'scoop', 'sweetheart']),
    length('neckWidening', 'Neck wider by', 'neckline', { default: 0, min: 0, max: 60 }),
    length('frontNeckDrop', 'Front neck lower by', 'neckline', { default: 0, min: 0, max: 100 }),
    length('backNeckDrop', 'Back neck lower by', 'neckline', { default: 0, min: 0, max: 100 }),
    length('facingDepth', 'Facing depth', 'neckline', { default: 50.8, min: 30, max: 60 }),
    angle('backSlope', 'Back shoulder slope', 'shoulder', { default: 18, min: 10, max: 26 }),
    angle('frontSlope', 'Front shoulder slope', 'shoulder', { default: 22, min: 12, max: 30 }),
    length('bustEase', 'Bust ease', 'body', { default: 80, min: 40, max: 160 }),
    length('waistEase', 'Waist ease', 'body', { default: 40, min: 10, max: 120 }),
    choice('sleeve', 'Sleeve', 'sleeve', ['none', 'plain', 'flared', 'bell', 'puff']),
    ...sleeveDesign,
    length('zipLength', 'Zip length', 'opening', { default: 350, min: 150, max: 500 }),
    length('neckAllowance', 'Neck allowance', 'allowances', { default: 6.35, min: 0, max: 15 }),
    length('shoulderAllowance', 'Shoulder allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
    length('armholeAllowance', 'Armhole allowance', 'allowances', { default: 10, min: 0, max: 15 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 19, min: 0, max: 30 }),
    length('centreBackAllowance', 'Centre back allowance', 'allowances', { default: 19, min: 0, max: 30 }),
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 12.7, min: 0, max: 25 }),
  ],
  rules: [
    lengthRule('backNeckWidth', 'Half width of the back neck', 'neckBase / 5 - 0.2cm'),
    lengthRule('frontNeckWidth', 'Half width of the front neck', 'neckBase / 5 - 0.5cm'),
    lengthRule('napeDepth', 'Nape below the side neck', 'backNeckWidth * 0.3'),
    lengthRule('backNeckDepth', 'Back neck depth', 'napeDepth + neckFall + backNeckDrop'),
    lengthRule('frontNeckDepth', 'Front neck depth', 'neckBase / 5 + 0.2cm + frontNeckDrop'),
    lengthRule('vNeckDepth', 'V neck: front depth', 'frontNeckDepth + 5.8cm'),
    ...neckRules,
    lengthRule('frontShoulder', 'Front shoulder', 'shoulderLength'),
    lengthRule('shoulderEase', 'Ease of the back shoulder', '0.8cm'),
    lengthRule('backShoulder', 'Back shoulder', 'shoulderLength + shoulderEase'),
    lengthRule('scyeLine', 'Underarm below the nape', 'bust / 8 + 9.5cm + armholeDeepening'),
    lengthRule(
      'balance',
      'Front longer than back over the bust',
      'frontWaistLength - napeToWaist - napeDepth',
    ),
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
    ...sleeveRules,
  ],
  found: {
    armholeDeepening: 'length',
    backTip: 'length',
    frontTip: 'length',
    neckFall: 'length',
    headHeight: 'length',
    frontGirth: 'length',
    backGirth: 'length',
    underarmLength: 'length',
  },
  draft(pen) {
    deepenFitted(pen)
    const front = pen.piece('front', 'Front')
    const back = pen.piece('back', 'Back')
    bodiceBackMarks(pen, back)
    bodiceFrontMarks(pen, front)
    const leans = neckLeans(pen, front, back)
    const backDrawn = drawBodiceBack(pen, back, leans.back)
    const frontDrawn = drawBodiceFront(pen, front, back.lengthOf('side'), leans.front)
    for (const piece of [front, back])
      piece.grain({ x: 35, y: piece.at('scyeLevel').y }, { x: 35, y: piece.at('centreWaist').y - 25 })
    front.cut({ cloth: 'main', count: 1, onFold: true, handed: false })
    back.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
    sewBodice(pen, frontDrawn)
    fitBodice(pen, front, back, frontDrawn.waist, backDrawn.waist)
    const bare = pen.chosen('sleeve') === 'none'
    if (!bare)
      setInSleeve(
        pen,
        { piece: front, edges: frontDrawn.runs('armhole').map((run) => run.edge) },
        wholeArmhole(back),
      )
    const runs = (piece: string, edge: string) =>
      piece === 'front' ? frontDrawn.runs(edge) : [{ piece, edge }]
    faceNeckAndArmholes(pen, [frontDrawn.faced, true], [backDrawn.faced, false], bare, {
      runs,
      shoulderEase: 'shoulderEase',
    })
  },
})

function sewBodice(pen: Pen, front: BodiceFront): void {
  pen.sew({
    id: 'shoulder',
    name: 'Shoulder',
    a: [{ piece: 'back', edge: 'shoulder' }],
    b: front.runs('shoulder'),
    join: 'eased',
    easeFrom: 'shoulderEase',
    smooth: true,
  })
  pen.sew({
    id: 'side',
    name: 'Side seam',
    a: [{ piece: 'back', edge: 'side' }],
    b: front.runs('side'),
    smooth: true,
  })
}

/** Bust at the underarm, waist with its darts closed. */
function fitBodice(
  pen: Pen,
  front: PiecePen,
  back: PiecePen,
  ofFront: FittedWaist,
  ofBack: FittedWaist,
): void {
  const waists = [...waistPaths('front', front, ofFront), ...waistPaths('back', back, ofBack)]
  pen.fit(fitAcross('waist', 'equal', pen.value('waistEase'), pen.value('waist'), waists))
  const end = back.at('underarm')
  const level = straight({ x: 0, y: end.y }, end)
  const chest = [{ piece: 'back', path: level, times: 2, length: end.x }]
  pen.fit(fitAcross('back-width', 'shown', 0, undefined, chest))
}

function waistPaths(id: string, piece: PiecePen, fitted: FittedWaist) {
  return fitted.waist.stretches.map((_, index) => {
    const edge = index === 0 ? 'waist' : `waist-${index + 1}`
    return { piece: id, path: piece.edge(edge).path, times: 2, length: piece.lengthOf(edge) }
  })
}

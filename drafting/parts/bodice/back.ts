import type { Point } from '../../contract'
import { cubic, openPath, pathLength, pointAt, slicePath, startTangent, towards, unit } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import { drawWaist, fitWaist, pinned, waistDarts } from '../fitted-waist'
import type { BodiceWay } from '.'
import { facedBody, type Faced } from '../facing'
import { backNeckline, chosenNeckline, leaning } from '../necklines'

/** Marks of neck, shoulder and levels of a fitted back, in drafting order. */
export function bodiceBackMarks(pen: Pen, back: PiecePen): void {
  const { widening } = chosenNeckline(pen)
  back.start('neckLevel', { x: 0, y: 0 }, 'Mark the level of the side neck on the centre')
  back.go('neckPoint', 'neckLevel', 'right', 'backNeckWidth', {
    say: 'Go across the width of the back neck',
    round: 'up',
  })
  const shoulder = towards(pen.value('backSlope'))
  back.aim('shoulderMeasured', 'neckPoint', shoulder, pen.length('frontShoulder'), {
    say: 'Down the slope go the length of the shoulder',
    by: 'frontShoulder',
    uses: ['backSlope'],
  })
  back.aim('shoulderTip', 'shoulderMeasured', shoulder, pen.length('shoulderEase'), {
    say: 'Go on by the ease of the back shoulder',
    by: 'shoulderEase',
    uses: ['backSlope'],
    drag: ['backSlope'],
  })
  back.aim('sideNeck', 'neckPoint', shoulder, pen.length(widening), {
    say: 'Open the neck along the shoulder',
    by: widening,
    uses: ['backSlope'],
    drag: ['neckWidening'],
  })
  pen.find(
    'neckFall',
    pen.value(widening) * Math.sin((pen.value('backSlope') * Math.PI) / 180),
    pen.usesOf([widening, 'backSlope']),
  )
  back.go('nape', 'neckLevel', 'down', 'napeDepth', { say: 'Come down to the nape' })
  back.go('centreNeck', 'neckLevel', 'down', 'backNeckDepth', {
    say: 'Come down the depth of the back neck',
    drag: ['backNeckDrop'],
  })
  back.go('scyeLevel', 'nape', 'down', 'scyeLine', {
    say: 'From the nape come down to the level of the underarm',
  })
  back.go('underarm', 'scyeLevel', 'right', 'backQuarter', {
    say: 'Go across a quarter of the bust with its ease',
    drag: ['bustEase'],
  })
  back.go('waistLevel', 'nape', 'down', 'napeToWaist', { say: 'From the nape come down to the waist' })
  back.go('centreWaist', 'waistLevel', 'right', 'centreBackIn', { say: 'Come in at the centre back' })
}

/** Draws the back from its marks: the waist fitted first, then neck, shoulder, armhole, side, waist and centre. */
export function drawBodiceBack(
  pen: Pen,
  back: PiecePen,
  lean: number,
  way: BodiceWay,
): { readonly faced: Faced; readonly waist: readonly string[] } {
  const at = (id: string): Point => back.at(id)
  const centreDown = unit(
    between({ x: 0, y: (at('scyeLevel').y + at('waistLevel').y) / 2 }, at('centreWaist')),
  )
  const names = ['backWaistHalf', 'backDart', 'centreBackIn', 'backQuarter', 'scyeLine']
  const axis = at('underarm').x * 0.44
  const darts = waistDarts(axis, at('scyeLevel').y, at('waistLevel').y, pen.value('backDart'))
  const centre = { at: at('centreWaist'), leaves: { x: centreDown.y, y: -centreDown.x } }
  const waist = fitWaist(
    pen,
    centre,
    at('underarm'),
    { level: at('waistLevel').y },
    darts,
    pen.value('backWaistHalf'),
  )
  back.place('sideWaist', waist.side, {
    say: 'Mark the waist on the side, found so that the waist fits',
    uses: names,
    stepKind: 'solve',
  })
  back.place(
    'halfDepth',
    { x: 0, y: (at('shoulderTip').y + at('underarm').y) / 2 },
    { say: 'Half way down the armhole', through: ['shoulderTip', 'underarm'] },
  )
  back.go('hollow', 'halfDepth', 'right', 'backHalf', {
    say: 'Go across half the back: the hollow of the armhole',
  })
  if (at('hollow').x > at('underarm').x - 15) {
    pen.refuse({
      field: 'acrossBack',
      code: 'impossible-shape',
      message:
        'Across the back the body is wider than this bust allows. Measure across back and bust again, or give more bust ease.',
      max: 2 * (at('underarm').x - 15),
    })
  }
  const shoulder = unit(between(at('neckPoint'), at('shoulderTip')))
  const side = straight(at('underarm'), at('sideWaist'))
  back.curve(
    'neckline',
    backNeckline(at('centreNeck'), at('sideNeck'), leaning(lean)),
    'centreNeck',
    'sideNeck',
    {
      role: 'neckline',
      allowance: 'neckAllowance',
      say: 'Draw the back neckline',
    },
  )
  back.line('shoulder', 'sideNeck', 'shoulderTip', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Draw the shoulder',
  })
  back.curve(
    'armhole',
    armholeCurve(at('shoulderTip'), at('hollow'), at('underarm'), shoulder, startTangent(side)),
    'shoulderTip',
    'underarm',
    {
      role: 'armhole',
      allowance: 'armholeAllowance',
      say: 'Draw the armhole',
      through: ['hollow', 'sideWaist'],
    },
  )
  back.line('side', 'underarm', 'sideWaist', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side seam',
  })
  const ends = { centre: 'centreWaist', side: 'sideWaist' }
  const edges = drawWaist(back, waist, ends, false, names, way.waist)
  centreBack(pen, back, centreDown, names, way)
  return { faced: facedBody(back), waist: edges }
}

/** The centre back: straight to the level of the underarm, then in to the waist, where it meets it square. */
function centreBack(pen: Pen, back: PiecePen, down: Point, uses: readonly string[], way: BodiceWay): void {
  const waist = back.at('centreWaist')
  const neck = back.at('centreNeck')
  const bend = { x: 0, y: Math.max(neck.y + 20, back.at('scyeLevel').y) }
  const long = waist.y - bend.y
  const whole = openPath([
    cubic(
      waist,
      { x: waist.x - (down.x * long) / 3, y: waist.y - (down.y * long) / 3 },
      { x: 0, y: bend.y + long * 0.33 },
      bend,
    ),
    { kind: 'line', from: bend, to: neck },
  ])
  const options = { allowance: 'centreBackAllowance', uses }
  if (way.buttons) {
    back.curve('centre', whole, 'centreWaist', 'centreNeck', {
      role: 'seam',
      say: 'The centre back seam, closed from the neck to the waist',
      ...options,
    })
    sewCentre(pen)
    return
  }
  const runsOn = way.zip === 'runs on'
  const zip = runsOn ? pathLength(whole) : Math.min(pen.length('zipLength'), pathLength(whole))
  if (!runsOn) pen.notion({ kind: 'zip', length: zip, count: 1 })
  const below = pathLength(whole) - zip
  if (below < 25) {
    back.curve('opening', whole, 'centreWaist', 'centreNeck', {
      role: 'opening',
      say: 'The whole centre back opens',
      ...options,
    })
    return
  }
  back.place('zipEnd', pointAt(whole, below), {
    say: 'Mark the end of the zip',
    uses: ['zipLength', ...uses],
    drag: ['zipLength'],
  })
  back.curve(
    'centre',
    pinned(slicePath(whole, 0, below), waist, back.at('zipEnd')),
    'centreWaist',
    'zipEnd',
    { role: 'seam', say: 'The centre back seam below the zip', ...options },
  )
  back.curve(
    'opening',
    pinned(slicePath(whole, below, pathLength(whole)), back.at('zipEnd'), neck),
    'zipEnd',
    'centreNeck',
    { role: 'opening', say: 'The opening for the zip', ...options },
  )
  sewCentre(pen)
}

function sewCentre(pen: Pen): void {
  pen.sew({
    id: 'centre-back',
    name: 'Centre back',
    a: [{ piece: 'back', edge: 'centre' }],
    b: [{ piece: 'back', edge: 'centre', mirrored: true }],
  })
}

import type { Path, Point } from '../contract'
import { unit, magnitude, endTangent } from '../geometry'
import type { Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import { between, type PiecePen } from '../pen/piece-pen'
import { armholeCurve } from './armhole'
import { fairCurve } from './hem'
import { backNeckline, chosenNeckline, leaning } from './necklines'
import { takenInOf, throughTakenIn } from './taken-in'
import { openNeck } from './open-neck'

/** Directions that the whole of one half is drawn by. */
export interface HalfShape {
  readonly shoulder: Point
  /** Down the side seam. */
  readonly side: Point
}

/** Unit direction of a flared side seam: so many degrees out of the vertical. */
export function flareDirection(degrees: number): Point {
  const turn = (degrees * Math.PI) / 180
  return { x: Math.sin(turn), y: Math.cos(turn) }
}

/**
 * The upper part of one half of a freehand dress: neck, shoulder, armhole level, hollow and underarm, in the order in which
 * they are chalked.
 */
export function upperMarks(pen: Pen, piece: PiecePen, side: 'front' | 'back'): void {
  const shape = chosenNeckline(pen)
  const sleeved = pen.chosen('sleeve') !== 'none'
  piece.start('neckLevel', { x: 0, y: 0 }, 'Fold the cloth; mark the level of the side neck on the centre')
  piece.go('neckPoint', 'neckLevel', 'right', 'neckWidth', {
    say: 'From the centre go across the width of the neck',
    round: 'up',
    shared: true,
  })
  piece.go('shoulderEnd', 'neckLevel', 'right', 'halfShoulder', {
    say: 'From the centre go across half the shoulders',
    shared: true,
  })
  piece.go('shoulderTip', 'shoulderEnd', 'down', 'shoulderSlope', {
    say: 'Come down the slope of the shoulder',
    drag: ['shoulderSlope'],
    shared: true,
  })
  const shoulder = unit(between(piece.at('neckPoint'), piece.at('shoulderTip')))
  openNeck(pen, piece, shoulder, magnitude(between(piece.at('neckPoint'), piece.at('shoulderTip'))), {
    through: ['neckPoint', 'shoulderTip'],
  })
  pen.find('neckFall', piece.at('sideNeck').y, piece.mark('sideNeck').y)
  const depth = side === 'back' ? 'backNeckDepth' : shape.depth
  const drop = side === 'front' ? 'frontNeckDrop' : 'backNeckDrop'
  piece.go('centreNeck', 'neckLevel', 'down', depth, {
    say: `From the level of the side neck come down the depth of the ${side} neck`,
    drag: [drop],
  })
  pen.tag({
    piece: piece.id,
    from: 'neckLevel',
    to: 'centreNeck',
    label: side === 'front' ? 'Neck depth' : 'Back neck depth',
    value: drop,
    over: pen.length(depth) - pen.value(drop),
  })
  pen.tag({
    piece: piece.id,
    from: 'shoulderEnd',
    to: 'shoulderTip',
    label: 'Shoulder slope',
    value: 'shoulderSlope',
  })
  const lowering = sleeved ? 'sleevedLowering' : 'armholeDrop'
  piece.go('leastLevel', 'neckLevel', 'down', 'armholeDepth', {
    say: 'From the level of the side neck come down the armhole depth',
    shared: true,
  })
  piece.go('armholeLevel', 'leastLevel', 'down', lowering, {
    say: sleeved ? 'Come down a little more for the sleeve' : 'Come down a little more if it is to be easy',
    drag: ['armholeDrop'],
    shared: true,
  })
  if (pen.value('armholeDeepening') > 0) {
    piece.go('chestLevel', 'armholeLevel', 'down', 'armholeDeepening', {
      say: 'Deepen the armhole until there is room for the arm',
      stepKind: 'solve',
      shared: true,
    })
  }
  const level = pen.value('armholeDeepening') > 0 ? 'chestLevel' : 'armholeLevel'
  piece.go('underarm', level, 'right', 'quarterBust', {
    say: 'Go across a quarter of the bust with its ease',
    drag: ['bustEase', 'armholeDrop'],
    shared: true,
    also: ['armholeDeepening'],
  })
  pen.tag({
    piece: piece.id,
    from: level,
    to: 'underarm',
    label: 'Quarter bust',
    step: `${piece.id}.underarm`,
  })
  const tip = piece.at('shoulderTip')
  piece.place(
    'halfDepth',
    { x: tip.x, y: (tip.y + piece.at('underarm').y) / 2 },
    {
      say: 'Square down from the shoulder to half the depth of the armhole',
      from: 'shoulderTip',
      through: ['shoulderTip', 'underarm'],
    },
  )
  const hollow = side === 'front' ? 'frontHollow' : 'backHollow'
  piece.go('hollow', 'halfDepth', 'left', `${hollow}In`, {
    say: 'Come in by the hollow of the armhole',
    drag: [hollow],
  })
  pen.tag({
    piece: piece.id,
    from: 'halfDepth',
    to: 'hollow',
    label: `${side === 'front' ? 'Front' : 'Back'} hollow`,
    value: hollow,
    over: pen.length(`${hollow}In`) - pen.value(hollow),
  })
}

/** The length, the side and the hem of one half: the same drop down the centre and down the side, or swung like a pair of compasses. */
export function lowerMarks(pen: Pen, piece: PiecePen, direction: Point): void {
  piece.go('lengthMark', 'neckLevel', 'down', 'length', {
    say: 'From the level of the side neck come down the length',
    drag: ['length'],
    shared: true,
  })
  pen.tag({ piece: piece.id, from: 'neckLevel', to: 'lengthMark', label: 'Length', value: 'length' })
  const swung = pen.chosen('hemWay') === 'swung'
  const underarm = piece.at('underarm')
  const drop = piece.at('lengthMark').y - underarm.y
  pen.find('hemDrop', drop, piece.mark('lengthMark').y | piece.mark('underarm').y)
  pen.find(
    'swingLoss',
    underarm.x * Math.tan((pen.value('flareAngle') * Math.PI) / 360),
    piece.mark('underarm').x,
  )
  const by = swung ? 'swungSide' : 'sideLength'
  piece.aim('sideHem', 'underarm', direction, pen.length(by), {
    say: swung
      ? 'Down the flare come as far as the compass reaches'
      : 'Down the flare come the same drop, less the side lift',
    by,
    uses: ['flareAngle'],
    drag: ['flare', 'length'],
    shared: true,
  })
}

/**
 * Neck, shoulder, armhole and side of one half, clockwise from the centre neck.
 *
 * @param lean how its neckline leaves the side neck, degrees from the vertical, inwards.
 * @param necks what both necklines follow from, as each leans with the other.
 */
export function drawHalf(
  pen: Pen,
  piece: PiecePen,
  side: 'front' | 'back',
  lean: number,
  necks: Mask,
): HalfShape {
  const at = (id: string): Point => piece.at(id)
  const shoulder = unit(between(at('sideNeck'), at('shoulderTip')))
  const ends = [at('centreNeck'), at('sideNeck'), leaning(lean)] as const
  const neckline = side === 'front' ? chosenNeckline(pen).draw(...ends) : backNeckline(...ends)
  const sidePath = takenIn(pen, piece, at('underarm'), at('sideHem'))
  const first = sidePath.segments[0]
  const down =
    first?.kind === 'cubic'
      ? unit(between(first.from, first.control1))
      : unit(between(at('underarm'), at('sideHem')))
  const neckMarks = ['neckPoint', 'shoulderTip']
  piece.curve('neckline', neckline, 'centreNeck', 'sideNeck', {
    role: 'neckline',
    allowance: 'neckAllowance',
    say:
      side === 'front'
        ? 'Draw the front neckline'
        : 'Draw the back neckline: flat at first, then up to the shoulder',
    through: neckMarks,
    mask: necks,
  })
  piece.line('shoulder', 'sideNeck', 'shoulderTip', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Join the side neck to the shoulder tip',
  })
  piece.curve(
    'armhole',
    armholeCurve(at('shoulderTip'), at('hollow'), at('underarm'), shoulder, down),
    'shoulderTip',
    'underarm',
    {
      role: 'armhole',
      allowance: 'armholeAllowance',
      say: 'Draw the armhole: square off the shoulder, in to the hollow, round to the underarm square to the side',
      through: ['hollow', 'sideHem', 'sideNeck'],
    },
  )
  piece.curve('side', sidePath, 'underarm', 'sideHem', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side seam',
    kind: 'line',
  })
  return { shoulder, side: down }
}

/** The side seam: straight, or curved through what corrections take in or let out at their levels. */
function takenIn(pen: Pen, piece: PiecePen, top: Point, bottom: Point): Path {
  const { path, places } = throughTakenIn(top, bottom, takenInOf(pen, 'side', top, bottom, 60))
  for (const { id, at } of places) {
    piece.place(`takenIn-${id}`, at, {
      say: 'Correction: take in the side seam here, the same on front and back',
    })
  }
  return path
}

/** The hem of one half, from the side to the centre, square to both. */
export function hemOf(pen: Pen, piece: PiecePen, centre: string): void {
  const direction = endTangent(piece.edge('side').path)
  const side = piece.at('sideHem')
  const middle = piece.at(centre)
  const hem = fairCurve(side, { x: -direction.y, y: direction.x }, middle, { x: -1, y: 0 })
  if (!hem) {
    pen.refuse({
      field: 'sideLift',
      code: 'impossible-shape',
      message:
        'The hem cannot be drawn in one fair curve: the side would have to rise too steeply. Lift the side less, or flare more.',
    })
  }
  piece.curve('hem', hem, 'sideHem', centre, {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Draw the hem in one fair curve, square to the side and to the centre',
    through: ['underarm'],
  })
}

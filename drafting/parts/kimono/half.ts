import type { Path, Point } from '../../contract'
import { add, line, openPath, scale, towards, unit } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { fairCurve } from '../hem'
import { backNeckline, chosenNeckline, leaning } from '../necklines'
import { kimonoLayout } from './layout'
import { cornerReach, hasGusset, steepestSleeve } from './room'

/** How a straight body ends: with slits in its sides, with a band sewn to its hem. */
export interface StraightWay {
  readonly slits: boolean
  readonly banded: boolean
}

/** Neck, shoulder, sleeve and underarm of one half, in the order in which they are chalked. */
export function kimonoMarks(pen: Pen, piece: PiecePen, side: 'front' | 'back'): void {
  const shape = chosenNeckline(pen)
  const along = towards(pen.value('overarmSlope'))
  const sloping = { uses: ['overarmSlope'], shared: true }
  piece.start('neckLevel', { x: 0, y: 0 }, 'Fold the cloth; mark the level of the side neck on the centre')
  piece.go('neckPoint', 'neckLevel', 'right', 'neckWidth', {
    say: 'From the centre go across the width of the neck',
    round: 'up',
    shared: true,
  })
  piece.aim('sideNeck', 'neckPoint', along, pen.length(shape.widening), {
    ...sloping,
    say: 'Open the neck along the slope',
    by: shape.widening,
    drag: ['neckWidening'],
  })
  pen.find('neckFall', piece.at('sideNeck').y, piece.mark('sideNeck').y)
  const depth = side === 'back' ? 'backNeckDepth' : shape.depth
  const drop = side === 'front' ? 'frontNeckDrop' : 'backNeckDrop'
  piece.go('centreNeck', 'neckLevel', 'down', depth, {
    say: `From the level of the side neck come down the depth of the ${side} neck`,
    drag: [drop],
  })
  piece.aim('shoulderTip', 'neckPoint', along, pen.length('shoulderAlong'), {
    ...sloping,
    say: 'Along the slope come to the end of the shoulder',
    by: 'shoulderAlong',
  })
  piece.aim('wristTop', 'shoulderTip', along, pen.length('kimonoSleeve'), {
    ...sloping,
    say: 'Go straight on by the length of the sleeve',
    by: 'kimonoSleeve',
    drag: ['sleeveReach', 'overarmSlope'],
  })
  piece.go('underarmLevel', 'neckLevel', 'down', 'kimonoUnderarm', {
    say: 'From the level of the side neck come down the depth of the underarm',
    shared: true,
  })
  piece.go('underarm', 'underarmLevel', 'right', 'kimonoQuarter', {
    say: 'Go across a quarter of the body with its ease',
    round: 'up',
    drag: ['bustEase', 'underarmLower'],
    shared: true,
  })
  findUnderarm(pen, piece)
  const top = piece.at('wristTop')
  const laid = kimonoLayout({
    neckWidth: piece.at('neckPoint').x,
    slope: pen.value('overarmSlope'),
    overarm: pen.length('shoulderAlong') + pen.length('kimonoSleeve'),
    mouth: pen.length('mouthWidth'),
    quarter: piece.at('underarm').x,
    underarm: piece.at('underarm').y,
    corner: pen.value(cornerReach(pen)),
    steepest: steepestSleeve(pen, pen.value('lengthDrawn') - pen.value('underarmDepth')),
  })
  piece.aim('wristLow', 'wristTop', unit(between(top, laid.wristLow)), pen.length('mouthWidth'), {
    say: 'Across the end of the sleeve come down its opening, alike to its upper and under side',
    by: 'mouthWidth',
    through: ['underarm', 'neckPoint'],
    uses: ['overarmSlope', 'sideFlare', 'length'],
    shared: true,
  })
  tags(pen, piece, drop, depth)
}

/** States how deep the underarm lies, which the least length follows from. */
function findUnderarm(pen: Pen, piece: PiecePen): void {
  pen.find('underarmDepth', piece.at('underarm').y, piece.mark('underarm').y)
}

function tags(pen: Pen, piece: PiecePen, drop: string, depth: string): void {
  const { widening } = chosenNeckline(pen)
  const tag = { piece: piece.id }
  pen.tag({
    ...tag,
    from: 'neckLevel',
    to: 'centreNeck',
    label: piece.id === 'front' ? 'Neck depth' : 'Back neck depth',
    value: drop,
    over: pen.length(depth) - pen.value(drop),
  })
  pen.tag({
    ...tag,
    from: 'neckPoint',
    to: 'sideNeck',
    label: 'Neck wider by',
    value: 'neckWidening',
    over: pen.length(widening) - pen.value('neckWidening'),
  })
  pen.tag({ ...tag, from: 'shoulderTip', to: 'wristTop', label: 'Sleeve from the shoulder' })
  pen.tag({ ...tag, from: 'wristTop', to: 'wristLow', label: 'Sleeve opening', value: 'mouthWidth' })
  pen.tag({ ...tag, from: 'underarmLevel', to: 'underarm', label: 'Quarter of the body' })
}

/** Length, side and slit of one half: the same drop from the underarm down the centre and down the side. */
export function straightLower(pen: Pen, piece: PiecePen, way: StraightWay): void {
  findUnderarm(pen, piece)
  piece.go('lengthMark', 'neckLevel', 'down', 'lengthDrawn', {
    say: 'From the level of the side neck come down the length',
    drag: ['length'],
    shared: true,
  })
  const longer = pen.value('lengthDrawn') - pen.value('length')
  pen.tag({
    piece: piece.id,
    from: 'neckLevel',
    to: 'lengthMark',
    label: 'Length',
    ...(longer > 0.01 ? {} : { value: 'length' }),
  })
  const underarm = piece.at('underarm')
  const drop = piece.at('lengthMark').y - underarm.y
  pen.find('sideDrop', drop, piece.mark('lengthMark').y | piece.mark('underarm').y)
  const down = unit({ x: pen.value('sideFlare'), y: drop })
  piece.aim('sideHem', 'underarm', down, drop, {
    say: 'Down the side, a little out at the hem, come the same drop',
    by: 'sideDrop',
    uses: ['sideFlare'],
    drag: ['sideFlare'],
    shared: true,
  })
  if (way.slits) {
    piece.aim('slitTop', 'sideHem', scale(down, -1), pen.length('slitDrawn'), {
      say: 'From the hem go up the side by the slit',
      by: 'slitDrawn',
      uses: ['sideFlare'],
      through: ['underarm'],
      drag: ['slitHeight'],
      shared: true,
    })
    const asAsked = pen.value('slitDrawn') === pen.value('slitHeight')
    pen.tag({
      piece: piece.id,
      from: 'slitTop',
      to: 'sideHem',
      label: 'Slit',
      ...(asAsked ? { value: 'slitHeight' } : {}),
    })
  }
}

/**
 * Draws one half clockwise from the centre neck to the foot of its centre.
 *
 * @param lean how its neckline leaves the side neck, degrees from the vertical, inwards.
 * @param necks what both necklines follow from, as each leans with the other.
 * @param foot the mark where the hem meets the centre.
 */
export function drawKimonoHalf(
  pen: Pen,
  piece: PiecePen,
  side: 'front' | 'back',
  lean: number,
  necks: Mask,
  foot: string,
  way: StraightWay,
): void {
  const at = (id: string): Point => piece.at(id)
  const ends = [at('centreNeck'), at('sideNeck'), leaning(lean)] as const
  piece.curve(
    'neckline',
    side === 'front' ? chosenNeckline(pen).draw(...ends) : backNeckline(...ends),
    'centreNeck',
    'sideNeck',
    {
      role: 'neckline',
      allowance: 'neckAllowance',
      say: side === 'front' ? 'Draw the front neckline' : 'Draw the back neckline: flat at first, then up',
      mask: necks,
    },
  )
  piece.line('shoulder', 'sideNeck', 'wristTop', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Join the side neck to the end of the sleeve in one line over the shoulder',
  })
  const along = unit(between(at('neckPoint'), at('wristTop')))
  const out = unit(between(at('underarm'), at('wristLow')))
  const through = ['neckPoint', 'underarm']
  const mouth = fairCurve(at('wristTop'), { x: -along.y, y: along.x }, at('wristLow'), {
    x: -out.y,
    y: out.x,
  })
  piece.curve('mouth', mouth ?? straight(at('wristTop'), at('wristLow')), 'wristTop', 'wristLow', {
    role: 'hem',
    allowance: 'mouthAllowance',
    corner: 'turned',
    say: 'Draw the end of the sleeve, square to its upper and under side',
    through,
  })
  underarm(pen, piece, out, way)
  if (way.slits) {
    piece.line('side-slit', 'slitTop', 'sideHem', {
      role: 'opening',
      allowance: 'sideAllowance',
      say: 'The slit, turned in',
    })
  }
  straightHem(pen, piece, foot, way)
}

/** The underside of the sleeve and the side: one line round the underarm, or two that a gusset is set between. */
function underarm(pen: Pen, piece: PiecePen, out: Point, way: StraightWay): void {
  const end = way.slits ? 'slitTop' : 'sideHem'
  const seam = { role: 'seam', allowance: 'sideAllowance' } as const
  if (hasGusset(pen)) {
    piece.line('sleeve-under', 'wristLow', 'underarm', {
      ...seam,
      corner: 'turned',
      say: 'Join the end of the sleeve to the corner under the arm',
    })
    piece.line('side', 'underarm', end, { ...seam, say: 'Draw the side' })
    return
  }
  const round = pen.length('underarmRound')
  const corner = piece.at('underarm')
  const down = unit(between(corner, piece.at('sideHem')))
  const options = { uses: ['underarmRound', 'sideFlare'], through: ['underarm', 'wristLow', 'sideHem'] }
  const first = add(corner, scale(out, round))
  const last = add(corner, scale(down, round))
  piece.place('roundStart', first, {
    ...options,
    say: 'On the sleeve mark where the rounding under the arm begins',
    drag: ['underarmRound'],
  })
  piece.place('roundEnd', last, { ...options, say: 'On the side mark where it ends' })
  const curve = fairCurve(first, scale(out, -1), last, down)
  piece.curve(
    'side',
    openPath([
      line(piece.at('wristLow'), first),
      ...(curve?.segments ?? [line(first, last)]),
      line(last, piece.at(end)),
    ]),
    'wristLow',
    end,
    {
      ...seam,
      corner: 'turned',
      say: 'Draw the underside of the sleeve, round the underarm and down the side in one line',
      through: ['underarm', 'roundStart', 'roundEnd'],
    },
  )
}

/** The hem from the side to the centre, square to both. */
export function straightHem(pen: Pen, piece: PiecePen, foot: string, way: StraightWay): void {
  const from = piece.at('sideHem')
  const to = piece.at(foot)
  const down = unit(between(piece.at('underarm'), from))
  const fair: Path | undefined = fairCurve(from, { x: -down.y, y: down.x }, to, { x: -1, y: 0 })
  if (!fair) {
    pen.refuse({
      field: 'sideFlare',
      code: 'impossible-shape',
      message: 'The hem cannot be drawn in one fair curve. Give the side a little more flare at the hem.',
    })
  }
  piece.curve('hem', fair, 'sideHem', foot, {
    ...(way.banded
      ? { role: 'seam', allowance: 'sideAllowance' }
      : { role: 'hem', allowance: 'hemAllowance', corner: 'turned' }),
    say: 'Draw the hem in one fair curve, square to the side and to the centre',
    through: ['underarm'],
  })
}

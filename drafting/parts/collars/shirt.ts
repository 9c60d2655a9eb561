import type { DesignValue, Path, Point, RuleDefinition } from '../../contract'
import { arcPath, cubic, openPath, pathLength, startOf } from '../../geometry'
import { angle, length, yesNo } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import { nothing } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { solveBetween } from '../../pen/solve'
import {
  closeBehind,
  cutCollar,
  drawEnd,
  fallingEnds,
  sewLayers,
  standingEnds,
  type Collar,
  type Neck,
  type NeckEdge,
} from './collar'
import { drawStand, standCurves } from './stand'

const shirtStand = { height: 'standHeight', rise: 'standRise' }
const worn = { id: 'collar', is: ['shirt'] }

export const shirtCollarDesign: readonly DesignValue[] = [
  yesNo('collarStand', 'With a stand', 'collar', true, worn),
  length('collarFall', 'Collar falls over by', 'collar', { default: 45, min: 35, max: 70 }, worn),
  length('pointLength', 'Length of the points', 'collar', { default: 70, min: 45, max: 110 }, worn),
  angle('collarSpread', 'Points spread by', 'collar', { default: 15, min: 0, max: 35 }, worn),
]

/** Common practice, no published source: what falls over is curved against its stand, so that its outer edge goes round the outside. */
export const shirtCollarRules: readonly RuleDefinition[] = [
  lengthRule('fallDrop', 'Ends of the fall dropped by', 'standRise * 0.5 + 1.4cm'),
  lengthRule('onePieceHeight', 'Height of a collar without a stand', 'standHeight + collarFall'),
  lengthRule('onePieceDrop', 'Ends of a collar without a stand dropped by', '1.2cm'),
]

/** A collar with points: a stand and what falls over it, or both cut in one. */
export const shirt: Collar = {
  stands: (pen) => (pen.chosen('collarStand') ? shirtStand : undefined),
  draw(pen, neck) {
    const half = neck.long.front + neck.long.back
    if (pen.chosen('collarStand')) return withStand(pen, neck, half)
    const collar = drawFall(pen, neck, half, {
      heightBy: 'onePieceHeight',
      dropBy: 'onePieceDrop',
      mask: neck.uses,
    })
    return { piece: collar, edge: 'neck', over: 0 }
  },
}

function withStand(pen: Pen, neck: Neck, half: number): NeckEdge {
  const lapped = neck.centres.front.kind === 'lap'
  const overlap = lapped ? neck.front.piece.edge('overlap-neck') : undefined
  const over = overlap ? pathLength(overlap.path) : 0
  const stand = pen.piece('collar-stand', 'Collar stand')
  const height = pen.length('standHeight')
  const curves = standCurves({ half, over, height, rise: pen.length('standRise') })
  const ends = standingEnds(neck.centres)
  const names = { ...shirtStand, corner: 0, over: overlap?.uses ?? nothing, allowance: 'collarAllowance' }
  const turned = drawStand(pen, stand, neck, curves, ends, names)
  cutCollar(stand, ends)
  stand.grain({ x: 12, y: -height * 0.2 }, { x: 12, y: -height * 0.8 })
  sewLayers(
    pen,
    stand,
    turned.filter((edge) => edge !== 'top'),
  )
  closeBehind(pen, stand, ends)
  const mask = neck.uses | pen.usesOf(['standHeight', 'standRise'])
  const fall = drawFall(pen, neck, pathLength(curves.top), {
    heightBy: 'collarFall',
    dropBy: 'fallDrop',
    mask,
  })
  pen.sew({
    id: 'collar-on-stand',
    name: 'Collar to its stand',
    a: [{ piece: stand.id, edge: 'top' }],
    b: [{ piece: fall.id, edge: 'neck', reversed: true }],
  })
  return { piece: stand, edge: 'neck', over }
}

/** What falls over: its neck edge an arc that drops to the front, its points as long and as spread as the style says. */
function drawFall(
  pen: Pen,
  neck: Neck,
  half: number,
  { heightBy, dropBy, mask }: { heightBy: string; dropBy: string; mask: bigint },
): PiecePen {
  const collar = pen.piece('collar', 'Collar')
  const uses = [dropBy]
  const neckEdge = droppedArc(half, pen.length(dropBy))
  const ends = fallingEnds(neck.centres)
  collar.start('centreBack', { x: 0, y: 0 }, 'Mark the centre back of the neck edge')
  collar.go('outerBack', 'centreBack', 'up', heightBy, {
    say: 'Go up the height of the collar at the centre back',
    drag: ['collarFall'],
  })
  pen.tag({
    piece: 'collar',
    from: 'centreBack',
    to: 'outerBack',
    label: 'Collar height',
    value: 'collarFall',
    over: pen.length(heightBy) - pen.value('collarFall'),
  })
  collar.place('neckFront', startOf(neckEdge.path), {
    say: 'Along the neck edge, dropping to the front, go its length',
    from: 'centreBack',
    uses,
    mask,
    stepKind: 'solve',
  })
  const spread = ((neckEdge.turn + pen.value('collarSpread')) * Math.PI) / 180
  collar.aim('point', 'neckFront', { x: Math.sin(spread), y: -Math.cos(spread) }, pen.length('pointLength'), {
    say: 'From the front of the neck edge go out to the point',
    by: 'pointLength',
    uses: ['collarSpread', ...uses],
    drag: ['pointLength', 'collarSpread'],
  })
  pen.tag({ piece: 'collar', from: 'neckFront', to: 'point', label: 'Point', value: 'pointLength' })
  collar.curve('neck', neckEdge.path, 'neckFront', 'centreBack', {
    role: 'neckline',
    allowance: 'neckAllowance',
    say: 'Draw the neck edge',
    uses,
    mask,
  })
  drawEnd(collar, 'centre-back', ends.back, 'centreBack', 'outerBack', 'collarAllowance')
  const turned = { role: 'free', finish: 'seam', allowance: 'collarAllowance' } as const
  collar.curve('outer', fallOuter(collar.at('outerBack'), collar.at('point')), 'outerBack', 'point', {
    ...turned,
    say: 'Draw the outer edge, square to the centre back',
  })
  collar.line('front-edge', 'point', 'neckFront', { ...turned, say: 'Draw the front edge of the collar' })
  cutCollar(collar, ends)
  const height = pen.length(heightBy)
  collar.grain({ x: 14, y: -height * 0.25 }, { x: 14, y: -height * 0.75 })
  sewLayers(pen, collar, [...(ends.back === 'end' ? ['centre-back'] : []), 'outer', 'front-edge'])
  return collar
}

/** An arc of a length from its front end to the centre back, dropped so far at the front; and how far it has turned there, degrees. */
function droppedArc(long: number, drop: number): { readonly path: Path; readonly turn: number } {
  const turn = solveBetween((by) => (long * (1 - Math.cos(by))) / by - drop, 1e-6, 1.5) ?? 1.5
  const radius = long / turn
  const degrees = (turn * 180) / Math.PI
  const arc = arcPath({ x: 0, y: radius }, radius, -90 + degrees, -90)
  const last = arc.segments.length - 1
  return {
    path: openPath(arc.segments.map((one, index) => (index === last ? { ...one, to: { x: 0, y: 0 } } : one))),
    turn: degrees,
  }
}

function fallOuter(back: Point, point: Point): Path {
  const level = { x: point.x * 0.5, y: back.y }
  return openPath([
    cubic(
      back,
      level,
      { x: point.x - (point.x - level.x) * 0.4, y: point.y - (point.y - level.y) * 0.4 },
      point,
    ),
  ])
}

import type { Path, Point } from '../contract'
import { applyTo, endOf, joinPaths, startTangent, subtract, unit } from '../geometry'
import type { Pen } from '../pen/pen'
import { straight } from '../pen/piece-pen'
import { drawWaist, pinned } from './fitted-waist'
import { fairCurve } from './hem'
import { drawSkirtCentre, skirtCentreMarks, type WalkingRoom } from './skirt-centre'
import type { DrawnHalf } from './skirt-seams'
import type { FittedHalf } from './skirt-waist'

/** What a fitted side follows from. */
const sideUses: readonly string[] = [
  'waistQuarter',
  'skirtQuarter',
  'sideTakes',
  'frontTakes',
  'backTakes',
  'frontDarts',
  'backDarts',
  'frontDartOut',
  'frontDartBetween',
  'frontDartLong',
  'backDartOut',
  'backDartBetween',
  'backDartLong',
  'backDartShorter',
  'sideRise',
  'centreBackDrop',
  'hipLine',
]

/**
 * Draws a half from its marks: waist and darts, side, hem and centre, clockwise from the centre.
 *
 * @param walking what opens below a zip at the centre back.
 * @param more what the side follows from beside the rules of the block.
 */
export function drawSkirtHalf(
  pen: Pen,
  half: FittedHalf,
  walking: WalkingRoom,
  more: readonly string[] = [],
): DrawnHalf {
  const { piece, fitted, sideSeam, turned } = half
  const uses = [...sideUses, ...more]
  piece.place('sideWaist', fitted.side, {
    say: 'Mark the waist on the side, found so that the waist fits with its darts closed',
    uses,
    through: ['hip', 'centreWaist'],
    stepKind: 'solve',
    shared: true,
  })
  const moved = more.length > 0
  if (moved) {
    piece.place('sideHip', applyTo(turned, piece.at('hip')), {
      say: 'Where the hip comes to lie when the dart is closed into the hem',
      uses,
      through: ['hip'],
      stepKind: 'turn',
    })
  }
  piece.place('sideHem', endOf(sideSeam), {
    say: 'From the hip go on to the hem, as far as at the centre',
    uses: [...uses, 'length'],
    through: ['hip', 'centreHem'],
    ...(moved ? { drag: ['flareMore'] } : {}),
  })
  skirtCentreMarks(pen, half, walking)
  const finish = pen.chosen('waistband') ? 'seam' : 'bound'
  const waists = drawWaist(piece, fitted, { centre: 'centreWaist', side: 'sideWaist' }, true, uses, finish)
  piece.curve('side', pinned(sideSeam, piece.at('sideWaist'), piece.at('sideHem')), 'sideWaist', 'sideHem', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side in a gentle curve over the hip and straight on to the hem',
    uses: [...uses, 'length'],
    through: ['hip'],
  })
  const end = piece.marks.has('ventHem') ? 'ventHem' : 'centreHem'
  piece.curve('hem', hemOf(half, piece.at(end)), 'sideHem', end, {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: moved ? 'Draw the hem in one fair curve, square to side and centre' : 'Draw the hem',
    uses: [...uses, 'length'],
    through: ['centreHem'],
  })
  drawSkirtCentre(pen, half, walking)
  const grain = { x: piece.at('hip').x * 0.14, y: piece.at('hipLevel').y + 20 }
  piece.grain(grain, { x: grain.x, y: piece.at('centreHem').y - 40 })
  const onFold = half.side === 'front' || pen.chosen('opening') === 'side zip'
  piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  return { piece, waists }
}

/** The hem from the side to the centre, square to both, and straight on below a vent. */
function hemOf({ piece, sideSeam }: FittedHalf, end: Point): Path {
  const from = piece.at('sideHem')
  const centre = piece.at('centreHem')
  const last = sideSeam.segments.at(-1)
  const down = last ? unit(subtract(last.to, last.from)) : startTangent(sideSeam)
  const curve =
    Math.abs(down.x) < 1e-9
      ? straight(from, centre)
      : (fairCurve(from, { x: -down.y, y: down.x }, centre, { x: -1, y: 0 }) ?? straight(from, centre))
  return end.x < centre.x ? joinPaths(curve, straight(centre, end)) : curve
}

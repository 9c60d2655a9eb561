import type { Path, Point } from '../../contract'
import { applyTo, endOf, endTangent, identity, joinPaths, pathLength, startOf, undo } from '../../geometry'
import { nothing } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { straight } from '../../pen/piece-pen'
import { drawWaist, pinned } from '../fitted-waist'
import { fairCurve } from '../hem'
import { takeIn } from '../take-in'
import { belowDartRules } from './below-darts'
import { drawSkirtCentre, skirtCentreMarks, type WalkingRoom } from './centre'
import type { DrawnHalf } from './seams'
import { hemFollows } from './marks'
import { backOnFold, sewnToBodice, waistFinish, type SkirtUse } from './skirt'
import { sideOf, waistTo, type FittedHalf } from './waist'

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
  use: SkirtUse,
  walking: WalkingRoom,
  more: readonly string[] = [],
): DrawnHalf {
  const { piece } = half
  const below = belowDartRules.map(({ id }) => id)
  const mask = use.sewnTo ? use.sewnTo.uses | pen.usesOf(below) : nothing
  const uses = [...sideUses, ...more]
  const follows = { uses, mask }
  sideMarks(half, follows, more.length > 0, use)
  const { path: side, top = 'sideWaist', end = 'sideHem' } = drawnSide(pen, half, use)
  skirtCentreMarks(pen, half, use, walking)
  const waist = waistTo(piece.at('centreWaist'), side, half.sewn)
  if (!waist) {
    return pen.refuse({
      field: 'waist',
      code: 'impossible-shape',
      message: 'The waist does not reach from the centre over its darts to the side.',
    })
  }
  const fitted = { side: startOf(side), darts: half.sewn, waist }
  const ends = { centre: 'centreWaist', side: top }
  const waists = drawWaist(piece, fitted, ends, true, uses, waistFinish(pen, use), mask)
  piece.curve('side', pinned(side, piece.at(top), piece.at(end)), top, end, {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side in a gentle curve over the hip and straight on to the hem',
    uses: [...uses, 'length'],
    through: ['hip'],
    mask,
  })
  const centre = piece.marks.has('ventHem') ? 'ventHem' : 'centreHem'
  const hem = hemOf(side, piece.at('centreHem'), piece.at(centre))
  piece.curve('hem', pinned(hem, piece.at(end), piece.at(centre)), end, centre, {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: more.length > 0 ? 'Draw the hem in one fair curve, square to side and centre' : 'Draw the hem',
    uses: [...uses, 'length'],
    through: ['centreHem'],
    mask,
  })
  drawSkirtCentre(pen, half, use, walking)
  const grain = { x: piece.at('hip').x * 0.14, y: piece.at('hipLevel').y + 20 }
  piece.grain(grain, { x: grain.x, y: piece.at('centreHem').y - 40 })
  const onFold = half.side === 'front' || backOnFold(use)
  piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  return { piece, waists, joints: waist.joints }
}

/** Marks of the side's two ends, and of the hip where it does not lie on its level any more. */
function sideMarks(
  { piece, turned, ends }: FittedHalf,
  follows: { readonly uses: readonly string[]; readonly mask: bigint },
  flared: boolean,
  use: SkirtUse,
): void {
  piece.place('sideWaist', applyTo(turned, ends.waist), {
    say: 'Mark the waist on the side, found so that the waist fits with its darts closed',
    ...follows,
    through: ['hip', 'centreWaist'],
    stepKind: 'solve',
    shared: true,
    ...(use.sewnTo ? { fixed: sewnToBodice } : {}),
  })
  if (turned !== identity || Math.abs(ends.hip.x - piece.at('hip').x) > 1e-9 || flared) {
    piece.place('sideHip', applyTo(turned, ends.hip), {
      say: flared
        ? 'Where the hip comes to lie when the dart is closed into the hem'
        : 'Where the hip comes to lie when the side stands below the side of the bodice',
      ...follows,
      through: ['hip'],
      stepKind: 'turn',
      fixed: 'Move the hip instead: this follows it.',
    })
  }
  piece.place('sideHem', applyTo(turned, ends.hem), {
    say: 'From the hip go on to the hem, as far as at the centre',
    ...follows,
    uses: [...follows.uses, 'length'],
    through: ['hip', 'centreHem'],
    fixed: hemFollows,
    ...(flared ? { drag: ['flareMore'] } : {}),
  })
}

/** The side from its marks, which corrections may have moved, taken in where they say so. */
function drawnSide(pen: Pen, { piece, turned, ends }: FittedHalf, { prefix, origin, sewnTo }: SkirtUse) {
  const flat = undo(turned)
  const path = sideOf({
    waist: applyTo(flat, piece.at('sideWaist')),
    hip: ends.hip,
    hem: applyTo(flat, piece.at('sideHem')),
  })
  const toHip = pathLength({ closed: false, segments: path.segments.slice(0, 1) })
  return takeIn(pen, piece, path, {
    seams: [`${prefix}side`],
    rests: [toHip],
    ends: sewnTo ? 'stay' : 'move',
    origin,
    turned,
    instead: sewnToBodice,
  })
}

/** The hem from the side to the centre, square to both, and straight on below a vent. */
function hemOf(side: Path, centre: Point, end: Point): Path {
  const from = endOf(side)
  const down = endTangent(side)
  const curve =
    Math.abs(down.x) < 1e-9
      ? straight(from, centre)
      : (fairCurve(from, { x: -down.y, y: down.x }, centre, { x: -1, y: 0 }) ?? straight(from, centre))
  return end.x < centre.x ? joinPaths(curve, straight(centre, end)) : curve
}

import type { Path, Point } from '../../contract'
import { intersections, mirrorX, reversePath, transformPath } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { fairCurve } from '../hem'
import { backFullness, frontFullness } from '../sleeve-head'
import { fitHead } from '../solve-head'
import { dippedHem, droppedHem } from './dropped-hem'
import type { Halves, SleeveCorners, SetInKind } from './sleeve-kind'

export const flip = (point: Point): Point => ({ x: -point.x, y: point.y })

/** The back half of a head is drawn as a front half and turned over. */
const turnedOver = (path: Path): Path => reversePath(transformPath(mirrorX, path))

/**
 * Draws the outline of a sleeve between its corners.
 *
 * @param head lengths of the halves of the head, mm.
 */
export function drawSleeve(
  pen: Pen,
  sleeve: PiecePen,
  kind: SetInKind,
  head: Halves,
  ends: SleeveCorners,
): void {
  const crown = sleeve.at(ends.crown)
  const frontArrives = squareTo(sleeve.at(ends.front), sleeve.at(ends.frontHem))
  const backArrives = squareTo(flip(sleeve.at(ends.back)), flip(sleeve.at(ends.backHem)))
  const frontHalf = fitHead(crown, sleeve.at(ends.front), frontArrives, head.front, frontFullness)
  const backHalf = fitHead(flip(crown), flip(sleeve.at(ends.back)), backArrives, head.back, backFullness)
  if (!frontHalf || !backHalf) {
    pen.refuse({ field: kind.blame.field, code: 'impossible-shape', message: kind.blame.head })
  }
  const names = ['biceps', kind.ease.front, kind.ease.back]
  const options = { through: [ends.front, ends.back, ends.crown, ends.frontHem, ends.backHem], uses: names }
  sleeve.curve('head-back', turnedOver(backHalf), ends.back, ends.crown, {
    role: 'armhole',
    allowance: 'armholeAllowance',
    say: 'Draw the back of the head: long and flat, the length of the back armhole and its ease',
    ...options,
  })
  sleeve.curve('head-front', frontHalf, ends.crown, ends.front, {
    role: 'armhole',
    allowance: 'armholeAllowance',
    say: 'Draw the front of the head: fuller above, scooped deeper below',
    ...options,
  })
  sleeve.line('underarm-front', ends.front, ends.frontHem, {
    role: 'seam',
    allowance: 'sleeveAllowance',
    say: 'Join the front underarm to the hem',
  })
  const gathered = kind.hem === 'gathered' || kind.hem === 'dipped'
  sleeve.curve('hem', sleeveHem(pen, sleeve, kind, ends), ends.frontHem, ends.backHem, {
    ...(gathered
      ? { role: 'seam', allowance: 'sleeveAllowance' }
      : { role: 'hem', allowance: 'sleeveHemAllowance', corner: 'turned' }),
    say: gathered
      ? 'Draw the hem down to where it was dropped and up again; it is gathered into its band'
      : 'Draw the hem in one sweep, square to both underarm seams',
    through: [gathered ? 'droppedHem' : 'hemLevel'],
  })
  sleeve.line('underarm-back', ends.backHem, ends.back, {
    role: 'seam',
    allowance: 'sleeveAllowance',
    ...(gathered ? {} : { corner: 'turned' }),
    say: 'Join the hem to the back underarm',
  })
  sleeve.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  const long = sleeve.at('hemLevel').y
  // A tapered hem rises in the middle.
  const down = straight({ x: 0, y: 0 }, { x: 0, y: long + 200 })
  const foot = intersections(sleeve.edge('hem').path, down)[0]?.point.y ?? long
  sleeve.grain({ x: 0, y: Math.min(long, foot) * 0.35 }, { x: 0, y: Math.min(long * 0.8, foot - 5) })
}

/** Square to an underarm seam, outwards: the direction in which the head reaches it. */
export function squareTo(underarm: Point, hem: Point): Point {
  const long = Math.hypot(hem.x - underarm.x, hem.y - underarm.y)
  return { x: (hem.y - underarm.y) / long, y: -(hem.x - underarm.x) / long }
}

/** One sweep from the front seam over the centre to the back seam. */
function sleeveHem(pen: Pen, sleeve: PiecePen, kind: SetInKind, ends: SleeveCorners): Path {
  const front = sleeve.at(ends.frontHem)
  const back = sleeve.at(ends.backHem)
  const leaves = squareTo(sleeve.at(ends.front), front)
  const arrives = squareTo(flip(sleeve.at(ends.back)), flip(back))
  const inwards = { front: { x: -leaves.x, y: -leaves.y }, back: { x: -arrives.x, y: arrives.y } }
  if (kind.hem === 'gathered') return droppedHem(front, back, sleeve.at('droppedHem'))
  if (kind.hem === 'dipped')
    return dippedHem(front, inwards.front, sleeve.at('droppedHem'), back, inwards.back)
  const bowed = kind.hem === 'bow'
  const centre = sleeve.at('hemLevel')
  const level = { x: -1, y: 0 }
  const right = bowed ? fairCurve(front, inwards.front, centre, level) : undefined
  const left = bowed ? fairCurve(centre, level, back, inwards.back) : undefined
  if (right && left) return { closed: false, segments: [...right.segments, ...left.segments] }
  const whole = fairCurve(front, inwards.front, back, inwards.back)
  if (!whole) {
    pen.refuse({ field: kind.blame.field, code: 'impossible-shape', message: kind.blame.hem })
  }
  return whole
}

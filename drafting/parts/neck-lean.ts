import type { Point } from '../contract'
import type { Pen } from '../pen/pen'
import { solveBetween } from '../pen/solve'
import { between, type PiecePen } from '../pen/piece-pen'
import { chosenNeckline } from './necklines'
import { mostCurvedLean } from './necklines/neckline'

/**
 * How the front and back necklines leave the side neck, degrees from the vertical, inwards. Laid together at the shoulder
 * they must run on without a corner, which their leans do when they add up to both slopes. Each would rather be square to
 * the shoulder; a deep neck can lean less than that without bending both ways, and then the other leans more.
 */
export function neckLeans(pen: Pen, front: PiecePen, back: PiecePen): { front: number; back: number } {
  const shape = chosenNeckline(pen)
  const slopeOf = (piece: PiecePen): number => {
    const shoulder = between(piece.at('sideNeck'), piece.at('shoulderTip'))
    return (Math.atan2(shoulder.y, shoulder.x) * 180) / Math.PI
  }
  const slope = { front: slopeOf(front), back: slopeOf(back) }
  const together = slope.front + slope.back
  const size = (piece: PiecePen): Point => between(piece.at('centreNeck'), piece.at('sideNeck'))
  const most = {
    front: shape.mostLean(size(front).x, -size(front).y),
    back: mostCurvedLean(size(back).x, -size(back).y),
  }
  const ofFront = Math.min(shape.lean(slope.front), most.front)
  const ofBack = Math.min(together - ofFront, most.back)
  const left = together - ofBack
  if (left <= most.front + 1e-9) return { front: left, back: ofBack }
  // Both a little nearer to straight than is fair by rule: still one bend, and the corner at the shoulder is gone.
  const [furthestFront, furthestBack] = [further(most.front), further(most.back)]
  if (together <= furthestFront + furthestBack) {
    const share =
      (together - most.front - most.back) / (furthestFront + furthestBack - most.front - most.back)
    const front = most.front + share * (furthestFront - most.front)
    return { front, back: together - front }
  }
  // The shallowest drop that would do, if any: the most lean falls as the neck gets deeper.
  const drop = pen.value('frontNeckDrop')
  const depth = -size(front).y
  const fits = (less: number): number => shape.mostLean(size(front).x, depth - less) - left
  const less = solveBetween(fits, 0, Math.min(drop, depth - 5), 1e-6)
  pen.refuse({
    field: less === undefined ? 'neckWidening' : 'frontNeckDrop',
    code: 'impossible-shape',
    message:
      'A neck so deep in front and back and so narrow makes a corner at the shoulder. Open it wider, or make front or back less deep.',
    ...(less === undefined ? {} : { min: 0, max: Math.max(0, Math.floor((drop - less) * 10) / 10) }),
  })
}

/** A lean whose curve runs nearer to straight: the level part at the centre shrinks by a third. Degrees. */
function further(lean: number): number {
  return (Math.atan(Math.tan((lean * Math.PI) / 180) * 1.2) * 180) / Math.PI
}

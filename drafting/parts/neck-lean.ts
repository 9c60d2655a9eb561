import type { Point } from '../contract'
import type { Pen } from '../pen/pen'
import { between, type PiecePen } from '../pen/piece-pen'
import { necklines } from './necklines'
import { mostCurvedLean } from './necklines/neckline'

/**
 * How the front and back necklines leave the side neck, degrees from the vertical, inwards. Laid together at the shoulder
 * they must run on without a corner, which their leans do when they add up to twice the slope. Each would rather be square to
 * the shoulder; a deep neck can lean less than that without bending both ways, and then the other leans more.
 */
export function neckLeans(pen: Pen, front: PiecePen, back: PiecePen): { front: number; back: number } {
  const shape = necklines[String(pen.chosen('neckShape'))]
  if (!shape) throw new Error('Every neck shape offered has a neckline.')
  const shoulder = between(front.at('sideNeck'), front.at('shoulderTip'))
  const slope = (Math.atan2(shoulder.y, shoulder.x) * 180) / Math.PI
  const size = (piece: PiecePen): Point => between(piece.at('centreNeck'), piece.at('sideNeck'))
  const most = {
    front: shape.mostLean(size(front).x, -size(front).y),
    back: mostCurvedLean(size(back).x, -size(back).y),
  }
  const ofFront = Math.min(shape.lean(slope), most.front)
  const ofBack = Math.min(2 * slope - ofFront, most.back)
  const left = 2 * slope - ofBack
  if (left <= most.front + 1e-9) return { front: left, back: ofBack }
  pen.refuse({
    field: 'frontNeckDrop',
    code: 'impossible-shape',
    message:
      'A neck so deep in front and back and so narrow makes a corner at the shoulder. Open it wider, or make front or back less deep.',
    min: 0,
    max: Math.max(0, pen.value('frontNeckDrop') - 20),
  })
}

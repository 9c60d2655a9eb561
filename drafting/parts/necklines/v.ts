import { add, cubic, openPath, scale } from '../../geometry'
import type { Neckline } from './neckline'

/** V: leaves the shoulder square, then runs straight to its point. */
export const v: Neckline = {
  depth: 'vNeckDepth',
  widening: 'neckWidening',
  lean: (slope) => slope,
  mostLean: () => 60,
  over: 'straight on',
  draw: (centre, side, leaves) => {
    const depth = centre.y - side.y
    const width = side.x - centre.x
    const reach = Math.min(0.3 * depth, (0.3 * width) / Math.max(1e-6, Math.abs(leaves.x)))
    const turn = add(side, scale(leaves, reach))
    const half = { x: (centre.x + turn.x) / 2, y: (centre.y + turn.y) / 2 }
    return openPath([cubic(centre, half, turn, side)])
  },
}

import { line, openPath } from '../../geometry'
import type { Neckline } from './neckline'

/** Square: level from the centre, a corner, straight up to the shoulder. */
export const square: Neckline = {
  depth: 'frontNeckDepth',
  widening: 'neckWidening',
  dartAt: 0.27,
  lean: () => 0,
  mostLean: (width, depth) => (Math.atan2(0.5 * width, depth) * 180) / Math.PI,
  draw: (centre, side, leaves) => {
    const corner = { x: side.x + (leaves.x * (centre.y - side.y)) / leaves.y, y: centre.y }
    return openPath([line(centre, corner), line(corner, side)])
  },
}

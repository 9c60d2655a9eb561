import type { Point } from '../../contract'
import { line, openPath } from '../../geometry'
import { fairCurve } from '../hem'
import type { Neckline } from './neckline'

/** How far down the strap comes, share of the depth of the neck. */
const strap = 0.58

/** How much each end of the curve over the bust turns from its chord, degrees: a shallow arc. */
const bulge = 26

/** The steepest that it rises from the centre, degrees. */
const steepest = -72

const pointing = (degrees: number): Point => ({
  x: Math.cos((degrees * Math.PI) / 180),
  y: Math.sin((degrees * Math.PI) / 180),
})

/** Sweetheart: rises from a point at the centre in a curve over each bust to a corner, then straight up to the shoulder. */
export const sweetheart: Neckline = {
  depth: 'sweetheartNeckDepth',
  widening: 'sweetheartWidening',
  over: 'level',
  dartAt: 0.26,
  lean: () => 0,
  mostLean: (width, depth) => (Math.atan2(0.6 * width, depth) * 180) / Math.PI,
  draw: (centre, side, leaves) => {
    const depth = centre.y - side.y
    const corner = {
      x: side.x + (leaves.x / leaves.y) * depth * strap,
      y: side.y + depth * strap,
    }
    const chord = (Math.atan2(corner.y - centre.y, corner.x - centre.x) * 180) / Math.PI
    // A deep narrow one must not stand upright on the fold: its allowance would run up it without end.
    const leaving = Math.max(chord - bulge, Math.min(chord - 4, steepest))
    const over = fairCurve(centre, pointing(leaving), corner, pointing(chord + bulge), 0.65)
    return openPath([...(over?.segments ?? [line(centre, corner)]), line(corner, side)])
  },
}

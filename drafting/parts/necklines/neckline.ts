import type { Path, Point } from '../../contract'
import { add, cubic, openPath, scale } from '../../geometry'

/** A shape of neckline over one half of a front, drawn from the centre to the side neck point. */
export interface Neckline {
  /** Rules that give its depth below the side neck level and its opening along the shoulder. */
  readonly depth: string
  readonly widening: string
  /** How far from the vertical, inwards, it would leave the side neck of a shoulder with this slope. Degrees. */
  readonly lean: (slope: number) => number
  /** The most that it may lean there without bending both ways, for a width and depth in mm. Degrees. */
  readonly mostLean: (width: number, depth: number) => number
  /** Style value that gives the depth of a keyhole below its centre, where it has one. */
  readonly keyhole?: string
  /** What can be sewn to it: any collar, or the funnel that belongs to it. */
  readonly takesCollar?: 'any' | 'funnel'
  /** Where a dart may open on it, share of its length from the centre: clear of a corner. Half way unless it says so. */
  readonly dartAt?: number
  /** How it goes on over a lapped front: straight on from a point, or level; otherwise the overlap mirrors it. */
  readonly over?: 'straight on' | 'level'
  /** @param leaves unit direction in which it leaves the side neck. */
  readonly draw: (centre: Point, side: Point, leaves: Point) => Path
}

/** A lean from the vertical, inwards, as a direction. */
export function leaning(degrees: number): Point {
  const turn = (degrees * Math.PI) / 180
  return { x: -Math.sin(turn), y: Math.cos(turn) }
}

/** The lean at which a curve square to the centre would still come round at the centre without bending both ways. */
export function mostCurvedLean(width: number, depth: number): number {
  return (Math.atan2(0.65 * width, depth) * 180) / Math.PI
}

/** A shallow wide neck turns up to the shoulder no tighter than about this, mm: half an inch of allowance goes round it. */
const tightest = 15

/** The tightest bend at the centre of a deep narrow neck that can still be faced, mm. Common practice. */
const sewable = 7

/**
 * A curve square to the centre that leaves the side neck in a given direction and bends one way only.
 *
 * @param flat how far it runs level from the centre, share of the width.
 * @param fall how far it runs on from the side neck, share of the depth.
 */
export function neckCurve(centre: Point, side: Point, leaves: Point, flat: number, fall: number): Path {
  const width = side.x - centre.x
  const depth = centre.y - side.y
  const along = (share: number): number => share * (leaves.y > 1e-9 ? depth / leaves.y : depth)
  const share = Math.min(fall, 0.9)
  // Where the two end directions cross: the level part must stop short of it.
  const corner = leaves.y > 1e-9 ? width + (leaves.x * depth) / leaves.y : width
  // How tightly it ends is the square of its last reach over what the level part leaves of the width.
  const level = Math.max(flat * width, width - (1.5 * along(share) ** 2) / tightest)
  const run = Math.min(level, 0.9 * corner)
  // A short level part would bend in a spike at the centre: then the curve runs on further from the shoulder.
  const reach = along(Math.max(share, Math.min(0.93, 1 - (1.5 * run * run) / (sewable * depth))))
  return openPath([cubic(centre, { x: centre.x + run, y: centre.y }, add(side, scale(leaves, reach)), side)])
}

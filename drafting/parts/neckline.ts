import type { Path, Point } from '../contract'
import { cubic, line, openPath, perpendicular, rotate, add, scale } from '../geometry'

/**
 * A neckline over one half of a piece, drawn from the centre to the side neck point.
 *
 * `leaves` is the direction in which it leaves the side neck (unit vector, into the neck): the neckline on the other side of
 * the shoulder seam runs on from it, so that the two meet without a corner.
 */
export interface Neckline {
  readonly path: Path
  /** Angle between the shoulder and the neckline inside the piece, degrees. */
  readonly angle: number
}

/** Draws the front neckline between the centre and the side neck. `shoulder` is the unit direction of the shoulder line. */
export type DrawNeckline = (centre: Point, side: Point, shoulder: Point) => Neckline

/**
 * A curve square to the centre that arrives at the side neck in a given direction. It never bends the other way: its reach
 * from the side neck is kept short where a leaning shoulder would carry it across the middle of a deep neck.
 *
 * @param flat how far it runs level from the centre, share of the width.
 * @param fall how far it runs on from the side neck, share of the depth.
 */
export function neckCurve(centre: Point, side: Point, leaves: Point, flat: number, fall: number): Path {
  const width = side.x - centre.x
  const depth = centre.y - side.y
  let reach = fall * depth
  if (leaves.x < 0) reach = Math.min(reach, (0.38 * width) / -leaves.x)
  // A neckline that leaves the shoulder slanting must still come down before it reaches the level of the centre.
  if (leaves.y > 1e-9) reach = Math.min(reach, (0.9 * depth) / leaves.y)
  return openPath([
    cubic(centre, { x: centre.x + flat * width, y: centre.y }, add(side, scale(leaves, reach)), side),
  ])
}

/** Round: square at the centre for a short way, widest low, square to the shoulder. */
export const round: DrawNeckline = (centre, side, shoulder) => ({
  path: neckCurve(centre, side, perpendicular(shoulder), 0.52, 0.5),
  angle: 90,
})

/** Boat: wide and nearly level, turning up to the shoulder at its end. */
export const boat: DrawNeckline = (centre, side, shoulder) => ({
  path: neckCurve(centre, side, perpendicular(shoulder), 0.6, 0.42),
  angle: 90,
})

/** V: leaves the shoulder square, then runs straight to its point. */
export const vNeck: DrawNeckline = (centre, side, shoulder) => {
  const leaves = perpendicular(shoulder)
  const depth = centre.y - side.y
  const width = side.x - centre.x
  const reach = Math.min(0.3 * depth, leaves.x < 0 ? (0.3 * width) / -leaves.x : Infinity)
  const turn = add(side, scale(leaves, reach))
  return {
    path: openPath([cubic(centre, { x: (centre.x + turn.x) / 2, y: (centre.y + turn.y) / 2 }, turn, side)]),
    angle: 90,
  }
}

/** Square: level from the centre, a corner, straight up to the shoulder. */
export const squareNeck: DrawNeckline = (centre, side, shoulder) => {
  const corner = { x: side.x, y: centre.y }
  return {
    path: openPath([line(centre, corner), line(corner, side)]),
    angle: 90 - (Math.atan2(shoulder.y, shoulder.x) * 180) / Math.PI,
  }
}

/** The necklines by their names in the style. */
export const necklines: Readonly<Record<string, DrawNeckline>> = {
  round,
  V: vNeck,
  square: squareNeck,
  boat,
}

/** The back neckline that runs on from a front neckline: flat for a third, then up. */
export function backNeckline(centre: Point, side: Point, shoulder: Point, frontAngle: number): Path {
  return neckCurve(centre, side, rotate(shoulder, 180 - frontAngle), 0.48, 0.85)
}

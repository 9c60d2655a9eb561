import type { Path, Point } from '../../contract'
import { neckCurve } from './neckline'

/** The back neckline: flat for a third, then up to the shoulder. */
export function backNeckline(centre: Point, side: Point, leaves: Point): Path {
  return neckCurve(centre, side, leaves, 0.48, 0.82)
}

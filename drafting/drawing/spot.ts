import type { Path, Point } from '../contract'
import { pointAt, tangentOn } from '../geometry/path'

/** A place on a path and the unit vector in which the path passes it; `distance` is mm along the path. */
export function spotOn(path: Path, distance: number): { readonly point: Point; readonly tangent: Point } {
  return { point: pointAt(path, distance), tangent: tangentOn(path, distance) }
}

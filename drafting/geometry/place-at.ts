import type { Path, Point } from '../contract'
import { pointAt, tangentOn } from './along'

/** A point of a path so far along it, mm, with the unit direction of travel there. */
export function placeAt(path: Path, distance: number): { readonly point: Point; readonly tangent: Point } {
  return { point: pointAt(path, distance), tangent: tangentOn(path, distance) }
}

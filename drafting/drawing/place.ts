import type { DrawingItem, Path, Point } from '../contract'
import { applyTo, compose, identity, rotation, transformPath, translation } from '../geometry/transform'
import type { Transform } from '../geometry/transform'
import type { Place } from './options'

const origin: Point = { x: 0, y: 0 }

/** The transform that lays a piece at its place. */
export function placeTransform(place: Place | undefined): Transform {
  if (!place) return identity
  const moved = translation(place.x, place.y)
  return place.turn ? compose(moved, rotation(place.turn, origin)) : moved
}

/** An item of a piece as it lies at the piece's place. Texts turn with their piece. */
export function placeItem(item: DrawingItem, place: Place | undefined): DrawingItem {
  return itemPlacer(place)(item)
}

/** Lays the items of one piece at its place. */
export function itemPlacer(place: Place | undefined): (item: DrawingItem) => DrawingItem {
  if (!place) return (item) => item
  const transform = placeTransform(place)
  return (item) =>
    item.kind === 'path'
      ? { ...item, path: transformPath(transform, item.path) }
      : { ...item, at: applyTo(transform, item.at), turn: item.turn + (place.turn ?? 0) }
}

/** A path as it lies at its piece's place. */
export function placePath(path: Path, place: Place | undefined): Path {
  return place ? transformPath(placeTransform(place), path) : path
}

/** Degrees brought into −90…90, so that no text stands on its head. */
export function readable(turn: number): number {
  const within = ((((turn + 180) % 360) + 360) % 360) - 180
  if (within > 90) return within - 180
  return within <= -90 ? within + 180 : within
}

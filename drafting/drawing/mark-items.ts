import type { Draft, DrawingItem, Mark, Path, Piece, Point } from '../contract'
import { arcPath } from '../geometry/arc'
import { polyline } from '../geometry/path'
import { point } from '../geometry/point'
import { pathItem, textItem } from './items'

/** Drill holes, buttons and stops: what is chalked through onto the cloth. */
export function markItems(piece: Piece, _draft: Draft): readonly DrawingItem[] {
  return piece.marks.flatMap((mark) => (mark.kind === 'construction' ? [] : markOf(piece, mark)))
}

function markOf(piece: Piece, mark: Mark): readonly DrawingItem[] {
  const drawn = shapes[mark.kind as keyof typeof shapes](mark.at).map((path, index) =>
    pathItem(piece, 'mark', index === 0 ? mark.id : `${mark.id}-${index}`, 'mark', path),
  )
  if (!mark.letter) return drawn
  const at = point(mark.at.x + 5, mark.at.y - 2)
  return [...drawn, textItem(piece, 'mark', `${mark.id}-letter`, 'mark-letter', mark.letter, at, 4)]
}

const shapes = {
  drill: (at: Point) => [circle(at, 1.5), ...cross(at, 0.8)],
  button: (at: Point) => [circle(at, 4), ...cross(at, 4)],
  end: (at: Point) => cross(at, 4),
}

function circle(at: Point, radius: number): Path {
  return arcPath(at, radius, 0, 360)
}

/** An upright cross, `arm` mm from its middle to each end. */
export function cross(at: Point, arm: number): Path[] {
  return [
    polyline([point(at.x - arm, at.y), point(at.x + arm, at.y)]),
    polyline([point(at.x, at.y - arm), point(at.x, at.y + arm)]),
  ]
}

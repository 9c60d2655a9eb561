import type { Draft, DrawingItem, Edge, Piece } from '../contract'
import { flatten, pathLength, polyline, slicePath } from '../geometry/path'
import { add, perpendicular, scale } from '../geometry/point'
import { arrowhead } from './arrowhead'
import { pathItem, textItem } from './items'
import type { DrawingOptions } from './options'
import { readable } from './place'
import { spotOn } from './spot'

/** How far inside the fold the bracket runs, mm. */
const bracketDepth = 9

/** The fold line, and the bracket whose arrows point at it: lay this edge on the folded cloth. */
export function foldItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  return piece.edges
    .filter((edge) => edge.role === 'fold' || edge.finish === 'fold')
    .flatMap((edge) => [
      // With allowances the fold runs on through those at its ends.
      pathItem(piece, 'fold', edge.id, 'fold', options.allowances === false ? edge.path : edge.cut),
      ...bracket(piece, edge, options.textScale ?? 1),
    ])
}

function bracket(piece: Piece, edge: Edge, textScale: number): readonly DrawingItem[] {
  const length = pathLength(edge.path)
  if (length < 25) return []
  const inset = Math.min(length * 0.2, 60)
  const depth = Math.min(bracketDepth, length / 5)
  const start = spotOn(edge.path, inset)
  const end = spotOn(edge.path, length - inset)
  // The outline runs clockwise, so the piece lies to the right of travel.
  const inside = (tangent: { x: number; y: number }, by: number) => scale(perpendicular(tangent), by)
  const along = flatten(slicePath(edge.path, inset, length - inset)).map((point) =>
    add(point, inside(start.tangent, depth)),
  )
  const head = depth * 0.4
  const items: DrawingItem[] = [
    pathItem(
      piece,
      'fold',
      `${edge.id}-bracket`,
      'bracket',
      polyline([
        add(start.point, inside(start.tangent, head)),
        ...along,
        add(end.point, inside(end.tangent, head)),
      ]),
    ),
    pathItem(
      piece,
      'fold',
      `${edge.id}-start`,
      'fold-arrowhead',
      arrowhead(start.point, inside(start.tangent, -1), head * 1.6, head),
    ),
    pathItem(
      piece,
      'fold',
      `${edge.id}-end`,
      'fold-arrowhead',
      arrowhead(end.point, inside(end.tangent, -1), head * 1.6, head),
    ),
  ]
  if (length < 70 * textScale) return items
  const middle = spotOn(edge.path, length / 2)
  const degrees = readable((Math.atan2(middle.tangent.y, middle.tangent.x) * 180) / Math.PI)
  const at = add(
    middle.point,
    inside(middle.tangent, depth + (inwardIsUp(middle.tangent, degrees) ? 1.8 : 1 + 4 * textScale)),
  )
  items.push(
    textItem(
      piece,
      'fold',
      `${edge.id}-text`,
      'label-small',
      'place on the fold',
      at,
      4 * textScale,
      degrees,
    ),
  )
  return items
}

/** Whether the inside of the piece lies above the text, as one reads it. */
function inwardIsUp(tangent: { x: number; y: number }, degrees: number): boolean {
  const inward = perpendicular(tangent)
  const radians = (degrees * Math.PI) / 180
  return inward.x * Math.sin(radians) - inward.y * Math.cos(radians) > 0
}

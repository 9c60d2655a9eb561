import type { Draft, DrawingItem, Edge, Notch, Piece } from '../contract'
import { pathLength, polyline } from '../geometry/path'
import { add, perpendicular, scale } from '../geometry/point'
import { pathItem } from './items'
import type { DrawingOptions } from './options'
import { spotOn } from './spot'

/** A notch is ⅛–¼ in deep (NIMI workbook, 2024), and never more than half the allowance (common practice). */
const deepest = 6
/** Between the two ticks of a back notch, mm. */
const apart = 4
/** Where there is no allowance to clip into, the tick is only a pencil mark, mm. */
const pencilled = 4

/** Short ticks into the allowance from the cut line: one for front, two for back. */
export function notchItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  const edges = new Map(piece.edges.map((edge) => [edge.id, edge]))
  return piece.notches.flatMap((notch) => {
    const edge = edges.get(notch.edge)
    return edge ? ticks(piece, edge, notch, options.allowances !== false) : []
  })
}

function ticks(piece: Piece, edge: Edge, notch: Notch, allowances: boolean): readonly DrawingItem[] {
  const length = pathLength(edge.path)
  const places = notch.ticks === 1 ? [notch.at] : [notch.at - apart / 2, notch.at + apart / 2]
  const allowance = allowances ? edge.allowance : 0
  const depth = allowance > 0 ? Math.min(deepest, allowance / 2) : pencilled
  return places.map((at, index) => {
    const { point, tangent } = spotOn(edge.path, Math.min(Math.max(at, 0), length))
    const outward = scale(perpendicular(tangent), -1)
    const outer = add(point, scale(outward, allowance))
    const tick = polyline([outer, add(outer, scale(outward, -depth))])
    return pathItem(piece, 'notch', index === 0 ? notch.id : `${notch.id}-second`, 'notch', tick)
  })
}

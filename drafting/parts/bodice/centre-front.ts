import type { Point } from '../../contract'
import { applyTo, line, openPath } from '../../geometry'
import type { PiecePen } from '../../pen/piece-pen'
import { pressed, tipOf, type Frames, type PlacedEdge } from './open-darts'

/**
 * The centre front from the waist to the neck where a bust dart opens on it: a seam above and below the dart, for the centre
 * no longer lies on one straight line. Without such a dart the centre is the opening's to draw.
 */
export function centreEdges(front: PiecePen, frames: Frames): readonly PlacedEdge[] {
  const [neck, waist] = [front.at('centreNeck'), front.at('centreWaist')]
  const edge = (id: string, of: string, from: string, start: Point, end: Point): PlacedEdge => ({
    id,
    of,
    from,
    path: openPath([line(start, end)]),
  })
  const dart = frames.centre
  if (!dart) return []
  const above = { x: neck.x, y: neck.y + dart.along(openPath([line(neck, waist)])) }
  const below = applyTo(frames.inner, above)
  const id = dart.dart.id
  return [
    edge('centre-below', 'centre', 'centreWaist', applyTo(frames.inner, waist), below),
    {
      ...edge(`${id}-lower`, 'dart', 'end-centre-below', below, dart.point),
      dart: id,
      press: pressed['centre front'],
    },
    { ...edge(`${id}-upper`, 'dart', tipOf(id), dart.point, above), dart: id },
    edge('centre', 'centre', `end-${id}-upper`, above, neck),
  ]
}

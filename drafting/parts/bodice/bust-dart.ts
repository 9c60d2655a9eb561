import type { Path, Point } from '../../contract'
import { pathLength, pointAt, rotation, slicePath, transformPath, type Transform } from '../../geometry'

/** One edge of the upper outline of a front, drawn with the bust dart open at its place or not yet. */
export interface UpperEdge {
  readonly id: string
  readonly path: Path
}

/** An edge, or a leg of the dart, as it lies on the finished piece. */
export interface PlacedEdge {
  /** The edge it is, or is a part of; the part beyond the dart is called `<id>-beyond`. */
  readonly id: string
  readonly of: string | 'dart'
  readonly path: Path
}

/**
 * Opens the bust dart at its place on the upper outline. What lies before it, clockwise from the centre neck, stays as drawn;
 * what lies beyond turns back about the dart's point by the dart's angle, so that the dart keeps its angle wherever it is.
 *
 * @param upper edges from the neckline to the side, drawn with the side swung up.
 * @param at the edge that the dart opens on, and how far along it, mm; undefined leaves the whole outline swung up, for a
 *   dart at the waist.
 * @param point the dart's point.
 * @param angle degrees.
 */
export function openDart(
  upper: readonly UpperEdge[],
  at: { readonly edge: string; readonly along: number } | undefined,
  point: Point,
  angle: number,
): { readonly edges: readonly PlacedEdge[]; readonly beyond: Transform | undefined } {
  const back = rotation(angle, point)
  const place = at ? upper.findIndex((edge) => edge.id === at.edge) : -1
  if (!at || place < 0) {
    return { edges: upper.map((edge) => ({ ...edge, of: edge.id })), beyond: undefined }
  }
  const edges: PlacedEdge[] = []
  upper.forEach((edge, index) => {
    if (index < place) edges.push({ ...edge, of: edge.id })
    else if (index > place) edges.push({ id: edge.id, of: edge.id, path: transformPath(back, edge.path) })
    else {
      const mouth = pointAt(edge.path, at.along)
      const first = slicePath(edge.path, 0, at.along)
      const rest = transformPath(back, slicePath(edge.path, at.along, pathLength(edge.path)))
      const from = first.segments.at(-1)?.to ?? mouth
      const to = rest.segments[0]?.from ?? mouth
      edges.push(
        { id: edge.id, of: edge.id, path: first },
        { id: 'bust-dart-upper', of: 'dart', path: leg(from, point) },
        { id: 'bust-dart-lower', of: 'dart', path: leg(point, to) },
        { id: `${edge.id}-beyond`, of: edge.id, path: rest },
      )
    }
  })
  return { edges, beyond: back }
}

const leg = (from: Point, to: Point): Path => ({ closed: false, segments: [{ kind: 'line', from, to }] })

import type { Draft, Point } from '../contract'
import { boundsOfPoints } from '../drawing/bounds'
import { bounds } from '../geometry'
import type { Sketch } from './index'

/**
 * A sketch with its window moved to the part that a choice is about: the neck, or the top with its sleeves. Other parts
 * show the whole garment.
 * @param part as style values name it
 */
export function closeUp(sketch: Sketch, draft: Draft, part: string): Sketch {
  const edges = draft.pieces.filter(({ id }) => id === 'front').flatMap((piece) => piece.edges)
  const cornersOf = (role: string) =>
    edges
      .filter((edge) => edge.role === role)
      .flatMap(({ path }) => {
        const { min, max } = bounds(path)
        return [min, max]
      })
  const neck = cornersOf('neckline')
  if (neck.length === 0) return sketch
  if (part === 'neckline' || part === 'collar') return windowOn(sketch, neck, 0.7)
  if (part === 'sleeve' || part === 'armhole') {
    const arm = cornersOf('armhole')
    // Sleeves hang beside the centre; body and collar lie on it.
    const sleeve = sketch.lines.flatMap(({ kind, path }) => {
      const { min, max } = bounds(path)
      return kind === 'shape' && (min.x > 0 || max.x < 0) ? [min, max] : []
    })
    return windowOn(sketch, [...arm, ...sleeve], 0.12)
  }
  return sketch
}

/** A window about points and their mirror images, wider by so much of their own size. */
function windowOn(sketch: Sketch, points: readonly Point[], room: number): Sketch {
  const { min, max } = boundsOfPoints(
    points.flatMap(({ x, y }) => [
      { x, y },
      { x: -x, y },
    ]),
  )
  const extra = room * Math.max(max.x - min.x, max.y - min.y)
  return {
    ...sketch,
    bounds: {
      min: { x: min.x - extra, y: min.y - extra * 0.3 },
      max: { x: max.x + extra, y: max.y + extra },
    },
  }
}

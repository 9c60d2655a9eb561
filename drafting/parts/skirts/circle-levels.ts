import type { Path, Point } from '../../contract'
import { arcPath, intersections, pathLength, slicePath } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { hipGirth, hipUnknown } from './fits'

/** Why no point of a circle is moved. */
export const byCompass =
  'A circle is drawn with the compass: change waist, share or length, or take in one of its seams.'
/** What to do about the ends of its seams. */
export const atWaist = 'At the waist change its ease, at the hem the length.'

/** No seam is let out by more, mm. */
const letOut = 150

/**
 * The level of the hip: an arc about the point of the circle, a little longer than the piece, which a seam let out makes wider.
 * Undefined where nobody knows it or the skirt ends above it.
 */
export function levelOf(pen: Pen, radius: number, from: number, to: number): Path | undefined {
  if (!pen.has('hip')) {
    hipUnknown(pen)
    return undefined
  }
  const down = pen.value('waistToHip')
  if (down >= pen.length('length')) return undefined
  const more = ((letOut / (radius + down)) * 180) / Math.PI
  return arcPath({ x: 0, y: -radius }, radius + down, from === 90 ? 90 : from + more, to - more)
}

/** The hip across pieces of a circle, from edge to edge as they are drawn. */
export function fitArcs(
  pen: Pen,
  pieces: readonly {
    readonly panel: PiecePen
    /** The edges on which the level starts and ends; none where it starts on the fold. */
    readonly ends: readonly [string | undefined, string] | readonly string[]
    readonly times: number
  }[],
  level: Path | undefined,
): void {
  if (!level) return
  const across = pieces.map(({ panel, ends: [first, last], times }) => {
    const meets = (edge: string | undefined): number | undefined =>
      edge ? intersections(level, panel.edge(edge).path)[0]?.a : undefined
    const path = slicePath(level, meets(first) ?? 0, meets(last) ?? pathLength(level))
    return { piece: panel.id, path, times, length: pathLength(path) }
  })
  hipGirth(pen, across, 'share')
}

/** Where a radius ends at an angle, degrees from the horizontal. */
export function onCircle(apex: Point, radius: number, degrees: number): Point {
  const turn = (degrees * Math.PI) / 180
  return { x: apex.x + radius * Math.cos(turn), y: apex.y + radius * Math.sin(turn) }
}
